import { type DraftFields, draftField, injectorOf, problemOf } from "../draft-fields";
import { describeField } from "./describe-field";
import type { CycleBench, Sheet, SheetColumn, SheetProblems, SheetRow } from "./types";

/** All that keeps a sheet from being recorded, by field. Doubtful readings do not: they are findings. */
export function problemsOf(fields: DraftFields, sheet: Sheet, bench: CycleBench | null): SheetProblems {
  const problems: SheetProblems = {};
  const add = (field: string, sentence: string) => {
    problems[field] = [...(problems[field] ?? []), sentence];
  };
  const shown = new Set(sheet.rows.map((row) => row.setInjectorId));
  for (const [field, text] of Object.entries(fields)) {
    const injector = injectorOf(field);
    if (injector && !shown.has(injector)) continue;
    const wrong = problemOf(field, text);
    if (wrong) add(field, `${describeField(field, sheet)}: ${wrong}`);
  }
  const missing = (field: string, sentence: string) => {
    if (!problems[field]) add(field, sentence);
  };
  checkConditions(sheet, missing);
  checkColumns(sheet, missing);
  checkPlaces(sheet, bench, missing);
  for (const row of sheet.rows) checkChecks(row, missing);
  return problems;
}

type Missing = (field: string, sentence: string) => void;

function checkConditions(sheet: Sheet, missing: Missing): void {
  if (!sheet.benchId) missing("benchId", "Please choose a bench.");
  if (!sheet.fluidId) missing("fluidId", "Please choose a fluid.");
  if (!sheet.driverKind) missing(draftField.condition("driverKind"), "Please choose the driver.");
  if (sheet.fluidTemperatureC === null)
    missing(draftField.condition("fluidTemperatureC"), "Fluid temperature is missing.");
  if (sheet.pressureKpa === null)
    missing(draftField.condition("pressureKpa"), "Pressure across the injector is missing.");
  if (sheet.driveVolts === null) missing(draftField.condition("driveVolts"), "Drive voltage is missing.");
  if (sheet.periodMs === null) missing(draftField.condition("periodMs"), "Period is missing.");
}

function checkColumns(sheet: Sheet, missing: Missing): void {
  const read = columnsWithReadings(sheet);
  if (read.length === 0) missing("readings", "Nothing has been read yet.");
  for (const column of read) {
    const part = (name: "pulseWidthMs" | "pulseCount" | "openSeconds") => draftField.column(column.id, name);
    if (column.heldOpen && column.openSeconds === null)
      missing(part("openSeconds"), "The time held open is missing.");
    if (!column.heldOpen && column.pulseWidthMs === null)
      missing(part("pulseWidthMs"), "A column with readings has no pulse width.");
    if (!column.heldOpen && column.pulseCount === null)
      missing(part("pulseCount"), `The pulse count at ${column.pulseWidthMs ?? "?"} ms is missing.`);
    const twin = read.find(
      (other) => column.pulseWidthMs !== null && other.pulseWidthMs === column.pulseWidthMs,
    );
    if (twin && twin !== column)
      missing(
        part("pulseWidthMs"),
        `Two columns have the pulse width ${column.pulseWidthMs} ms. Repeats are runs of one column.`,
      );
  }
}

export function columnsWithReadings(sheet: Sheet): SheetColumn[] {
  const read = new Set(sheet.rows.flatMap((row) => row.readings.map((reading) => reading.columnId)));
  return sheet.columns.filter((column) => read.has(column.id));
}

function checkPlaces(sheet: Sheet, bench: CycleBench | null, missing: Missing): void {
  const taken = new Map<string, string>();
  for (const row of sheet.rows) {
    const field = draftField.channel(row.setInjectorId);
    if (row.channelNumber === null) {
      missing(field, `${row.tag} has no channel.`);
      continue;
    }
    const place = `${row.load}/${row.channelNumber}`;
    const other = taken.get(place);
    if (other) missing(field, `${row.tag} and ${other} are both in channel ${row.channelNumber}.`);
    taken.set(place, row.tag);
    if (bench && !bench.channels.some((channel) => channel.number === row.channelNumber))
      missing(field, `${bench.code} has no channel ${row.channelNumber}.`);
  }
}

function checkChecks({ setInjectorId, tag, checks }: SheetRow, missing: Missing): void {
  const field = (key: keyof typeof checks) => draftField.check(setInjectorId, key);
  if (checks.windingOhm !== null && checks.windingTemperatureC === null)
    missing(field("windingTemperatureC"), `${tag}: the temperature of the winding is missing.`);
  if (checks.leakageMm3PerMin !== null && checks.leakagePressureKpa === null)
    missing(field("leakagePressureKpa"), `${tag}: the pressure of the leakage check is missing.`);
  if (checks.leakageMm3PerMin !== null && checks.leakageSeconds === null)
    missing(field("leakageSeconds"), `${tag}: the time of the leakage check is missing.`);
}
