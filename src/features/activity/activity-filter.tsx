import { buttonStyle } from "@/ui/button-style";
import { controlStyle } from "@/ui/form/control-style";
import { ButtonLink } from "@/ui/layout/button-link";

type Props = {
  chosen: Record<string, string>;
  events: readonly string[];
  people: { value: string; label: string }[];
};

/** By person, event and period; plain GET, so that what was found can be linked to. */
export function ActivityFilter({ chosen, events, people }: Props) {
  return (
    <form method="get" className="mb-3 flex flex-wrap items-end gap-3">
      {chosen.setId ? <input type="hidden" name="setId" value={chosen.setId} /> : null}
      <label className="flex flex-col gap-1 text-small font-medium">
        Person
        <select name="personId" defaultValue={chosen.personId ?? ""} className={controlStyle}>
          <option value="">everybody</option>
          {people.map(({ value, label }) => (
            <option key={value} value={value}>
              {label}
            </option>
          ))}
        </select>
      </label>
      <label className="flex flex-col gap-1 text-small font-medium">
        Event
        <select name="event" defaultValue={chosen.event ?? ""} className={controlStyle}>
          <option value="">any</option>
          {events.map((event) => (
            <option key={event}>{event}</option>
          ))}
        </select>
      </label>
      {(["from", "until"] as const).map((name) => (
        <label key={name} className="flex flex-col gap-1 text-small font-medium">
          {name === "from" ? "From" : "Until"}
          <input type="date" name={name} defaultValue={chosen[name] ?? ""} className={controlStyle} />
        </label>
      ))}
      <button type="submit" className={buttonStyle("plain")}>
        Filter
      </button>
      {Object.keys(chosen).length > 0 ? (
        <ButtonLink href="/activity" kind="quiet">
          Show all
        </ButtonLink>
      ) : null}
    </form>
  );
}
