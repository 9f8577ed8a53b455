import type { SetDetail } from "@/data/sets";
import { formatRecordInstant } from "@/format/format-date";
import { DataTable } from "@/ui/layout/data-table";
import type { DataColumn } from "@/ui/layout/data-table-column";

type Happening = { at: Date; what: string; by: string; reason: string | null };
type Course = Pick<SetDetail, "course" | "hold" | "earlierHolds" | "handOver">;

/** The course of a set with persons, times and reasons, newest last. */
export function CourseList({ set, zone }: { set: Course; zone: string }) {
  return (
    <DataTable
      caption="Course of the set"
      columns={columnsIn(zone)}
      rows={happeningsOf(set)}
      rowKey={({ at, what }) => `${at.toISOString()} ${what}`}
      dense
    />
  );
}

function columnsIn(zone: string): DataColumn<Happening>[] {
  return [
    { key: "at", head: "When", cell: ({ at }) => formatRecordInstant(at, zone) },
    { key: "what", head: "What", cell: ({ what }) => what },
    { key: "by", head: "By", cell: ({ by }) => by },
    { key: "reason", head: "Reason", cell: ({ reason }) => reason, wrap: true },
  ];
}

function happeningsOf({ course, hold, earlierHolds, handOver }: Course): Happening[] {
  const holds = [...earlierHolds, ...(hold ? [hold] : [])];
  return [
    ...course.map(({ at, from, to, by, reason }) => ({ at, what: stepWords(from, to), by, reason })),
    ...holds.map(({ heldAt, heldBy, reason }) => ({ at: heldAt, what: "put on hold", by: heldBy, reason })),
    ...earlierHolds.map(({ clearedAt, clearedBy, clearedReason }) => ({
      at: clearedAt,
      what: "taken off hold",
      by: clearedBy,
      reason: clearedReason,
    })),
    ...(handOver
      ? [
          {
            at: handOver.at,
            what: `${handOver.way}, taken by ${handOver.takenBy}`,
            by: handOver.handedOverBy,
            reason: null,
          },
        ]
      : []),
  ].sort((one, other) => one.at.getTime() - other.at.getTime());
}

function stepWords(from: string | null, to: string): string {
  if (from === "in review" && to === "as left") return "sent back to the bench";
  return to;
}
