import Link from "next/link";
import type { BenchPlace, InstrumentCalibration } from "@/data/benches";
import { dayOf, isoDay } from "@/format/calendar";
import { formatRecordDayOf } from "@/format/format-date";
import { StatusMark } from "@/ui/feedback/status-mark";
import { DataTable } from "@/ui/layout/data-table";
import { Sheet } from "@/ui/layout/sheet";
import { CorrectCalibrationDialog, RevokeCalibrationDialog } from "./calibration-dialogs";

type Row = InstrumentCalibration & { code: string };
type Props = { places: BenchPlace[]; zone: string; mayChange: boolean };

/** Every calibration of what stands on the bench, newest first, with the certificates that rest on it. */
export function CalibrationHistory({ places, zone, mayChange }: Props) {
  const rows: Row[] = places
    .flatMap(({ instrument }) =>
      instrument ? instrument.calibrations.map((each) => ({ ...each, code: instrument.code })) : [],
    )
    .sort((one, other) => other.validFrom.getTime() - one.validFrom.getTime());
  return (
    <Sheet title="Calibrations" padding="none">
      <DataTable
        caption="Calibrations, newest first"
        dense
        rows={rows}
        rowKey={({ calibrationId }) => calibrationId}
        columns={[
          { key: "reference", head: "Calibration", cell: ({ reference }) => reference },
          { key: "code", head: "Instrument", cell: ({ code }) => code },
          { key: "from", head: "From", cell: ({ validFrom }) => formatRecordDayOf(validFrom, zone) },
          { key: "until", head: "Until", cell: ({ validUntil }) => formatRecordDayOf(validUntil, zone) },
          { key: "gain", head: "Gain", align: "right", cell: ({ gain }) => gain },
          { key: "offset", head: "Offset", align: "right", cell: ({ offset }) => offset },
          { key: "by", head: "Recorded by", cell: ({ recordedBy }) => recordedBy },
          { key: "state", head: "State", cell: standing, wrap: true },
          { key: "certificates", head: "Certificates", cell: certificatesOf, wrap: true },
          ...(mayChange
            ? [
                {
                  key: "steps",
                  head: <span className="sr-only">Steps</span>,
                  cell: (row: Row) => <Steps row={row} zone={zone} />,
                },
              ]
            : []),
        ]}
        empty={<p className="px-4 pb-4 text-ink-2">None is recorded yet.</p>}
      />
    </Sheet>
  );
}

function standing({ inForce, ended, corrects }: Row) {
  if (ended)
    return ended.as === "replaced" ? (
      "replaced"
    ) : (
      <StatusMark kind="fail">
        {ended.as}: {ended.reason} ({ended.by})
      </StatusMark>
    );
  return (
    <>
      {inForce ? <StatusMark kind="pass">in force</StatusMark> : "not in force"}
      {corrects ? (
        <span className="block text-small">
          corrects {corrects.reference}: {corrects.reason}
        </span>
      ) : null}
    </>
  );
}

function certificatesOf({ certificates }: Row) {
  if (certificates.length === 0) return "none";
  return (
    <details>
      <summary>{certificates.length}</summary>
      {certificates.map(({ certificateId, number, state }) => (
        <Link key={certificateId} href={`/certificates/${certificateId}`} className="block">
          {number}
          {state === "current" ? "" : `, ${state}`}
        </Link>
      ))}
    </details>
  );
}

function Steps({ row, zone }: { row: Row; zone: string }) {
  if (row.ended && row.ended.as !== "replaced") return null;
  return (
    <span className="flex justify-end gap-1">
      {row.ended ? null : (
        <CorrectCalibrationDialog calibration={row} validUntil={isoDay(dayOf(row.validUntil, zone))} />
      )}
      <RevokeCalibrationDialog calibration={row} />
    </span>
  );
}
