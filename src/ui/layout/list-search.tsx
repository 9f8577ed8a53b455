import { buttonStyle } from "../button-style";
import { controlStyle } from "../form/control-style";

type Props = { label: string; placeholder?: string; search: string; children?: React.ReactNode };

/** A search over a list that the address describes: plain GET, so that a result can be linked to. */
export function ListSearch({ label, placeholder, search, children }: Props) {
  return (
    <search className="mb-2.5 block">
      <form method="get" className="flex max-w-xl flex-wrap gap-2">
        {children}
        <input
          type="search"
          name="search"
          aria-label={label}
          placeholder={placeholder}
          defaultValue={search}
          autoComplete="off"
          maxLength={160}
          className={`${controlStyle} max-w-80 flex-1`}
        />
        <button type="submit" className={buttonStyle("plain")}>
          Search
        </button>
      </form>
    </search>
  );
}
