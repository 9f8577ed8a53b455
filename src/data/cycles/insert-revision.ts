import "server-only";
import type { Transaction } from "../../db/client";
import { cycleInjectors, cycleInstruments, cycleRevisions } from "../../db/schema/cycles";
import { injectorChecks, readings } from "../../db/schema/readings";
import type { AcknowledgedFinding } from "./results";
import { ownInstrumentsUsed } from "./sheet/missing-calibrations";
import { readingsOf } from "./sheet/run-of-sheet";
import type { CycleBench, Sheet, SheetRow } from "./sheet/types";

type NewRevision = {
  cycleId: string;
  revision: number;
  reason: string | null;
  /** Complete: nothing that it needs is null any more. */
  sheet: Sheet;
  bench: CycleBench;
  acknowledged: AcknowledgedFinding[];
  personId: string;
};

/** Writes a revision with everything that was read: the rows that all figures are made from. */
export async function insertRevision(transaction: Transaction, entry: NewRevision): Promise<string> {
  const { sheet, bench } = entry;
  const [added] = await transaction
    .insert(cycleRevisions)
    .values(revisionValues(entry))
    .returning({ id: cycleRevisions.id });
  const revisionId = added!.id;
  await transaction
    .insert(cycleInjectors)
    .values(sheet.rows.map((row) => ({ revisionId, ...placeOf(bench, row) })));
  await transaction.insert(cycleInstruments).values(
    ownInstrumentsUsed(bench, sheet).map(({ instrumentId, calibration }) => ({
      revisionId,
      instrumentId,
      calibrationId: calibration!.calibrationId,
    })),
  );
  await insertReadings(transaction, revisionId, sheet);
  await insertChecks(transaction, revisionId, sheet.rows);
  return revisionId;
}

function revisionValues({ sheet, bench, personId, ...entry }: NewRevision) {
  return {
    ...entry,
    benchId: bench.benchId,
    fluidId: sheet.fluidId!,
    fluidTemperatureC: sheet.fluidTemperatureC!,
    pressureKpa: sheet.pressureKpa!,
    driveVolts: sheet.driveVolts!,
    driverKind: sheet.driverKind!,
    periodMs: sheet.periodMs!,
    collects: bench.collects,
    repeatability: bench.repeatability,
    note: sheet.note,
    recordedBy: personId,
  };
}

function placeOf(bench: CycleBench, row: SheetRow) {
  const { channelId, instrument } = bench.channels.find((channel) => channel.number === row.channelNumber)!;
  return {
    setInjectorId: row.setInjectorId,
    channelId,
    load: row.load,
    instrumentId: instrument!.instrumentId,
    calibrationId: instrument!.calibration!.calibrationId,
  };
}

/** PostgreSQL takes 65 535 values in one statement. */
const rowsAtOnce = 5000;

async function insertReadings(transaction: Transaction, revisionId: string, sheet: Sheet): Promise<void> {
  const rows = sheet.rows.flatMap((row) =>
    readingsOf(sheet, row).map((reading) => ({ revisionId, setInjectorId: row.setInjectorId, ...reading })),
  );
  for (let start = 0; start < rows.length; start += rowsAtOnce)
    await transaction.insert(readings).values(rows.slice(start, start + rowsAtOnce));
}

async function insertChecks(transaction: Transaction, revisionId: string, rows: SheetRow[]): Promise<void> {
  const checked = rows.filter(({ checks }) =>
    Object.values(checks).some((value) => value !== null && value !== ""),
  );
  if (checked.length === 0) return;
  await transaction
    .insert(injectorChecks)
    .values(checked.map(({ setInjectorId, checks }) => ({ revisionId, setInjectorId, ...checks })));
}
