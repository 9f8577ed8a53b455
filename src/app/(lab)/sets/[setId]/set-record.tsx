import type { SetResults } from "@/data/cycles/results";
import type { SetDetail } from "@/data/sets";
import { CourseList } from "@/features/results/course-list";
import { RevisionsList } from "@/features/results/revisions-list";
import { InjectorsTable } from "@/features/sets/injectors-table";
import type { Clock } from "@/format/calendar";
import { formatBytes } from "@/format/format-bytes";
import { formatRecordInstant } from "@/format/format-date";
import { plural } from "@/format/plural";
import { DataTable } from "@/ui/layout/data-table";
import { Facts } from "@/ui/layout/facts";
import { Sheet } from "@/ui/layout/sheet";

type Props = { set: SetDetail; results: SetResults; clock: Clock; roles: readonly string[] };

/** Intake, course and every recorded cycle with its corrections. */
export function SetRecord({ set, results, clock, roles }: Props) {
  const tags = new Map(set.injectors.map(({ setInjectorId, tag }) => [setInjectorId, tag]));
  const cycles = [
    ...results.repeatedCycles.map((cycle) => ({ ...cycle, counts: false })),
    ...[results.asFound, results.asLeft].flatMap((phase) =>
      phase ? [{ ...phase, revisions: [phase.latest, ...phase.earlierRevisions], counts: true }] : [],
    ),
  ];
  const words = [
    { label: "Customer's request", value: set.customerRequest },
    { label: "Internal note", value: set.internalNote ?? "" },
  ].filter(({ value }) => value !== "");
  return (
    <div className="flex flex-col gap-3.5">
      <Sheet title="Intake" padding="none">
        {words.length > 0 ? (
          <div className="px-4 pb-3">
            <Facts align="left" facts={words} />
          </div>
        ) : null}
        <InjectorsTable injectors={set.injectors} clock={clock} />
      </Sheet>
      <Sheet title="Course" padding="none">
        <CourseList set={set} zone={clock.zone} />
      </Sheet>
      {cycles.length > 0 ? (
        <Sheet title="Recorded cycles">
          <RevisionsList cycles={cycles} tagOf={(id) => tags.get(id) ?? "an injector"} zone={clock.zone} />
        </Sheet>
      ) : null}
      {results.readingFiles.length > 0 && !roles.every((role) => role === "counter") ? (
        <Sheet title="Reading files" note="as they were sent" padding="none">
          <DataTable
            caption="Reading files"
            rows={results.readingFiles}
            rowKey={({ readingFileId }) => readingFileId}
            columns={[
              {
                key: "name",
                head: "File",
                cell: ({ readingFileId, name }) => (
                  <a href={`/api/files/reading-files/${readingFileId}`} className="underline">
                    {name}
                  </a>
                ),
              },
              { key: "rows", head: "Rows", cell: ({ rows }) => plural(rows, "row") },
              { key: "size", head: "Size", align: "right", cell: ({ sizeBytes }) => formatBytes(sizeBytes) },
              { key: "by", head: "Sent by", cell: ({ sentBy }) => sentBy },
              { key: "at", head: "When", cell: ({ sentAt }) => formatRecordInstant(sentAt, clock.zone) },
            ]}
          />
        </Sheet>
      ) : null}
    </div>
  );
}
