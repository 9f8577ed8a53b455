import type { CleaningRun } from "@/data/cycles/results";
import { formatRecordInstant } from "@/format/format-date";
import { formatQuantity } from "@/format/format-number";
import { DataTable } from "@/ui/layout/data-table";
import type { DataColumn } from "@/ui/layout/data-table-column";

type Run = Omit<CleaningRun, "corrects"> & { correctedBy: string | null };

/** Every run; an entry that was corrected stays readable below the one that corrects it. */
export function CleaningRunsTable({ runs, zone }: { runs: CleaningRun[]; zone: string }) {
  return (
    <DataTable
      caption="Cleaning runs"
      columns={columnsIn(zone)}
      rows={runs.flatMap(withCorrected)}
      rowKey={(run) => run.cleaningRunId}
      empty={<p className="px-4 pb-3 text-ink-2">None is recorded.</p>}
    />
  );
}

function withCorrected({ corrects, ...run }: CleaningRun): Run[] {
  const chain = [run, ...corrects];
  return chain.map((entry, index) => ({ ...entry, correctedBy: chain[index - 1]?.correctionReason ?? null }));
}

function columnsIn(zone: string): DataColumn<Run>[] {
  return [
    { key: "at", head: "Recorded", cell: (run) => formatRecordInstant(run.recordedAt, zone) },
    { key: "by", head: "By", cell: (run) => run.recordedBy.name },
    {
      key: "bath",
      head: "Bath, detergent batch",
      cell: (run) => `${run.bath}, ${run.detergentBatch}`,
    },
    {
      key: "time",
      head: "Time, temperature",
      cell: (run) =>
        `${formatQuantity(run.minutes, "minutes")}, ${formatQuantity(run.temperatureC, "temperature")}`,
    },
    { key: "flush", head: "Back-flushed", cell: (run) => (run.backFlushed ? "yes" : "no") },
    { key: "parts", head: "Parts renewed", cell: (run) => run.partsRenewed.join(", ") || "none", wrap: true },
    { key: "note", head: "Note", cell: noteOf, wrap: true },
  ];
}

function noteOf({ note, correctedBy }: Run) {
  return (
    <>
      {note}
      {correctedBy ? <span className="block text-out">Corrected: {correctedBy}</span> : null}
    </>
  );
}
