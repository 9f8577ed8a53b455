import Link from "next/link";
import type { SetDetail, SetInjector } from "@/data/sets";
import type { Clock } from "@/format/calendar";
import { formatDayOf } from "@/format/format-date";
import { StatusMark } from "@/ui/feedback/status-mark";
import { DataTable } from "@/ui/layout/data-table";
import type { DataColumn } from "@/ui/layout/data-table-column";

type Props = {
  injectors: SetDetail["injectors"];
  clock: Clock;
  /** Off for customers, who have pages of their own. */
  linkVisits?: boolean;
};

/** What the counter wrote down of each injector, and where it was before. */
export function InjectorsTable({ injectors, clock, linkVisits = true }: Props) {
  const columns: DataColumn<SetInjector>[] = [
    { key: "tag", head: "Tag", cell: ({ tag }) => tag },
    { key: "serial", head: "Serial", cell: ({ serial }) => serial ?? <None>none</None> },
    { key: "marking", head: "Marking", cell: ({ marking }) => marking },
    { key: "condition", head: "Condition on receipt", cell: conditionWords, wrap: true },
    { key: "state", head: "In the set", cell: stateWords, wrap: true },
    {
      key: "visits",
      head: "Here before",
      cell: ({ earlierVisits }) => <Visits visits={earlierVisits} clock={clock} linked={linkVisits} />,
      wrap: true,
    },
  ];
  return (
    <DataTable
      caption="Injectors as they came in"
      columns={columns}
      rows={injectors}
      rowKey={({ setInjectorId }) => setInjectorId}
      dense
    />
  );
}

function conditionWords({ condition, conditionNote }: SetInjector) {
  return (
    <>
      {condition}
      {conditionNote ? <span className="block text-small text-ink-2">{conditionNote}</span> : null}
    </>
  );
}

function stateWords({ state, replacesTag, rejection }: SetInjector) {
  if (state === "in set") return replacesTag ? `in place of ${replacesTag}` : "yes";
  return (
    <>
      <StatusMark kind="fail">{state === "replaced" ? "rejected, replaced" : "rejected"}</StatusMark>
      {rejection ? (
        <span className="block text-small text-ink-2">
          {rejection.reason} ({rejection.by})
        </span>
      ) : null}
    </>
  );
}

type VisitsProps = { visits: SetInjector["earlierVisits"]; clock: Clock; linked: boolean };

function Visits({ visits, clock, linked }: VisitsProps) {
  if (visits.length === 0) return <None>first visit</None>;
  return visits.map(({ setId, number, checkedInAt }, at) => (
    <span key={setId}>
      {at > 0 ? ", " : null}
      {linked ? <Link href={`/sets/${setId}`}>{number}</Link> : number}{" "}
      <span className="text-small text-ink-2">{formatDayOf(checkedInAt, clock)}</span>
    </span>
  ));
}

function None({ children }: { children: string }) {
  return <span className="text-ink-2">{children}</span>;
}
