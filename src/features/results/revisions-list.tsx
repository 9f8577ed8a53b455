import type { CycleRevision, PhaseResults } from "@/data/cycles/results";
import { formatRecordInstant } from "@/format/format-date";
import { DataTable } from "@/ui/layout/data-table";
import { type Difference, differencesBetween } from "./revision-differences";

type Cycle = Pick<PhaseResults, "cycleId" | "phase" | "number"> & {
  revisions: CycleRevision[];
  counts: boolean;
};
type Props = { cycles: Cycle[]; tagOf: (setInjectorId: string) => string; zone: string };

/** Each cycle with who recorded it, and every correction with its reason and what it changed. */
export function RevisionsList({ cycles, tagOf, zone }: Props) {
  return (
    <ul className="flex flex-col gap-3">
      {cycles.map(({ cycleId, phase, number, revisions, counts }) => (
        <li key={cycleId}>
          <h3 className="font-medium">
            Cycle {number} {phase}
            {counts ? null : <span className="font-normal text-ink-2">, followed by a later one</span>}
          </h3>
          <ol className="mt-1 flex flex-col gap-2">
            {revisions.map((revision, index) => (
              <li key={revision.cycleRevisionId}>
                <Revision revision={revision} before={revisions[index + 1]} tagOf={tagOf} zone={zone} />
              </li>
            ))}
          </ol>
        </li>
      ))}
    </ul>
  );
}

type RevisionProps = Pick<Props, "tagOf" | "zone"> & { revision: CycleRevision; before?: CycleRevision };

function Revision({ revision, before, tagOf, zone }: RevisionProps) {
  const { recordedBy, recordedAt, reason, note } = revision;
  return (
    <>
      <p className="text-ink-2">
        Revision {revision.revision}: {before ? "corrected" : "recorded"} by {recordedBy.name},{" "}
        {formatRecordInstant(recordedAt, zone)}
      </p>
      {reason ? <p>{reason}</p> : null}
      {note ? <p className="text-small text-ink-2">Note: {note}</p> : null}
      {before ? <Differences differences={differencesBetween(before, revision, tagOf)} /> : null}
    </>
  );
}

function Differences({ differences }: { differences: Difference[] }) {
  return (
    <div className="mt-1 rounded-sheet border border-hair-2">
      <DataTable
        caption="What the correction changed"
        columns={[
          { key: "what", head: "What", cell: ({ what }: Difference) => what },
          { key: "before", head: "Before", align: "right", cell: ({ before }) => before },
          { key: "after", head: "After", align: "right", cell: ({ after }) => after },
        ]}
        rows={differences}
        rowKey={({ what }) => what}
        empty={<p className="px-4 py-2 text-ink-2">No figure changed.</p>}
        dense
      />
    </div>
  );
}
