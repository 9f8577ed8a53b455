import type { PhaseResults, UsedCalibration } from "@/data/cycles/results";
import { formatRecordDayOf } from "@/format/format-date";
import { formatNumber } from "@/format/format-number";
import { StatusMark } from "@/ui/feedback/status-mark";
import { DataTable } from "@/ui/layout/data-table";
import type { DataColumn } from "@/ui/layout/data-table-column";

type Row = UsedCalibration & { usedIn: string };

/** Every calibration that the figures rest on, with the day it is due. */
export function CalibrationsTable({ phases, zone }: { phases: PhaseResults[]; zone: string }) {
  return (
    <DataTable
      caption="Calibrations used"
      columns={columnsIn(zone)}
      rows={rowsOf(phases)}
      rowKey={(row) => row.calibrationId}
      dense
    />
  );
}

function rowsOf(phases: PhaseResults[]): Row[] {
  const rows = new Map<string, Row>();
  for (const { phase, latest } of phases)
    for (const used of latest.calibrations) {
      const known = rows.get(used.calibrationId);
      rows.set(used.calibrationId, { ...used, usedIn: known ? `${known.usedIn}, ${phase}` : phase });
    }
  return [...rows.values()];
}

function columnsIn(zone: string): DataColumn<Row>[] {
  return [
    { key: "instrument", head: "Instrument", cell: (row) => row.instrumentCode },
    {
      key: "kind",
      head: "Kind",
      cell: (row) => (row.channelNumber === null ? row.kind : `${row.kind}, channel ${row.channelNumber}`),
    },
    { key: "reference", head: "Calibration", cell: (row) => row.reference },
    { key: "gain", head: "Gain", align: "right", cell: (row) => formatNumber(row.gain, "gain") },
    { key: "due", head: "Due", cell: (row) => formatRecordDayOf(row.validUntil, zone) },
    { key: "used", head: "Used", cell: (row) => row.usedIn },
    {
      key: "state",
      head: "Today",
      cell: standing,
      wrap: true,
    },
  ];
}

function standing({ endedAs, endedReason }: Row) {
  if (endedAs === null) return "in force";
  if (endedAs === "replaced") return "replaced in its time";
  return (
    <StatusMark kind="fail">
      {endedAs}: {endedReason}
    </StatusMark>
  );
}
