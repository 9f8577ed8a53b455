import { Plus } from "lucide-react";
import { type ReactNode, useEffect, useRef } from "react";
import { classNames } from "../class-names";
import { Busy } from "../feedback/busy";
import type { ComboboxOption } from "./combobox-option";

type Props = {
  id: string;
  label: ReactNode;
  options: ComboboxOption[];
  chosen: string | undefined;
  active: number;
  state: "settled" | "searching" | "failed";
  /** Words of the last entry, which makes a new one. */
  create: ReactNode | null;
  onTake: (index: number) => void;
};

export function ComboboxList({ id, options, chosen, active, state, create, onTake }: Props) {
  const place = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (active >= 0)
      place.current?.querySelector('[data-active="true"]')?.scrollIntoView({ block: "nearest" });
  }, [active]);
  return (
    <div
      ref={place}
      className="absolute inset-x-0 top-full z-30 mt-1 max-h-72 overflow-y-auto rounded-control border border-hair bg-raised py-1 shadow-float thin-scrollbar"
    >
      <Words state={state} none={options.length === 0 && !create} />
      <div id={id} role="listbox" aria-label="Found">
        {options.map((option, index) => (
          <Entry
            key={option.value}
            id={`${id}-${index}`}
            active={active === index}
            onTake={() => onTake(index)}
          >
            <span className={option.value === chosen ? "font-semibold" : undefined}>{option.label}</span>
            {option.note ? <span className="text-small text-ink-2">{option.note}</span> : null}
          </Entry>
        ))}
        {create ? (
          <Entry
            id={`${id}-${options.length}`}
            active={active === options.length}
            onTake={() => onTake(options.length)}
          >
            <span className="flex items-center gap-1.5 font-medium text-petrol">
              <Plus aria-hidden="true" size={14} />
              {create}
            </span>
          </Entry>
        ) : null}
      </div>
    </div>
  );
}

function Words({ state, none }: { state: Props["state"]; none: boolean }) {
  if (state === "settled" && !none) return null;
  return (
    <div className="px-2.5 py-1.5 text-small">
      {state === "searching" ? <Busy>Searching</Busy> : null}
      {state === "failed" ? (
        <p role="alert" className="text-out">
          The search did not answer. Type on to try again.
        </p>
      ) : null}
      {state === "settled" && none ? (
        <p role="status" className="text-ink-2">
          Nothing found.
        </p>
      ) : null}
    </div>
  );
}

type EntryProps = { id: string; active: boolean; onTake: () => void; children: ReactNode };

function Entry({ id, active, onTake, children }: EntryProps) {
  return (
    // biome-ignore lint/a11y/useFocusableInteractive: the focus stays in the text box, which points here
    // biome-ignore lint/a11y/useKeyWithClickEvents: the text box takes the keys
    <div
      id={id}
      role="option"
      aria-selected={active}
      data-active={active}
      onMouseDown={(event) => event.preventDefault()}
      onClick={onTake}
      className={classNames(
        "touch-target flex cursor-pointer flex-wrap items-baseline justify-between gap-x-3 px-2.5 py-1.5 hover:bg-hair-2",
        active && "bg-petrol-soft",
      )}
    >
      {children}
    </div>
  );
}
