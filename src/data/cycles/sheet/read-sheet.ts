import {
  type CheckKey,
  type ColumnPart,
  type ConditionKey,
  type DraftFields,
  draftField,
  heldOpenColumn,
  type SharedCheckKey,
  typedValue,
} from "../draft-fields";
import type { InjectorChecks } from "../results";
import type { DriverKind, Sheet, SheetColumn, SheetInjector, SheetReading, SheetRow } from "./types";

/** Reads the sheet from the texts of its fields. Wrong texts read as null; `problemsOf` names them. */
export function readSheet(fields: DraftFields, injectors: SheetInjector[]): Sheet {
  const condition = (key: ConditionKey) => typedValue<number>(fields, draftField.condition(key));
  const columns = readColumns(fields);
  const repeats = Math.max(typedValue<number>(fields, "repeats") ?? 1, highestRun(fields));
  return {
    benchId: typedValue(fields, "benchId"),
    fluidId: typedValue(fields, "fluidId"),
    fluidTemperatureC: condition("fluidTemperatureC"),
    pressureKpa: condition("pressureKpa"),
    driveVolts: condition("driveVolts"),
    periodMs: condition("periodMs"),
    driverKind: typedValue<DriverKind>(fields, draftField.condition("driverKind")),
    note: typedValue<string>(fields, "note") ?? "",
    repeats,
    columns,
    rows: injectors.map((injector) => readRow(fields, injector, columns, repeats)),
  };
}

/** Columns in which anything stands, right or not: width columns by number, held open last. */
export function columnIds(fields: DraftFields): string[] {
  const ids = new Set<string>();
  for (const [field, text] of Object.entries(fields)) {
    const [, id] = /^(?:column|reading\.[^.]+)\.(\w+)\./.exec(field) ?? [];
    if (id && text !== "") ids.add(id);
  }
  return [...ids].sort((a, b) => orderOf(a) - orderOf(b));
}

/** A run in which something was read is shown, also when fewer runs were asked for meanwhile. */
function highestRun(fields: DraftFields): number {
  let highest = 1;
  for (const [field, text] of Object.entries(fields))
    if (field.startsWith("reading.") && text !== "") highest = Math.max(highest, Number(field.split(".")[3]));
  return highest;
}

function orderOf(columnId: string): number {
  return columnId === heldOpenColumn ? Number.POSITIVE_INFINITY : Number(columnId.slice(1));
}

function readColumns(fields: DraftFields): SheetColumn[] {
  return columnIds(fields).map((id) => {
    const part = (name: ColumnPart) => typedValue<number>(fields, draftField.column(id, name));
    const heldOpen = id === heldOpenColumn;
    return {
      id,
      heldOpen,
      pulseWidthMs: heldOpen ? null : part("pulseWidthMs"),
      pulseCount: heldOpen ? null : part("pulseCount"),
      openSeconds: heldOpen ? part("openSeconds") : null,
    };
  });
}

function readRow(
  fields: DraftFields,
  { setInjectorId, tag }: SheetInjector,
  columns: SheetColumn[],
  repeats: number,
): SheetRow {
  const readings: SheetReading[] = [];
  for (let repeat = 1; repeat <= repeats; repeat++)
    for (const { id } of columns) {
      const amount = typedValue<number>(fields, draftField.reading(setInjectorId, id, repeat));
      if (amount !== null) readings.push({ columnId: id, repeat, amount });
    }
  return {
    setInjectorId,
    tag,
    channelNumber: typedValue(fields, draftField.channel(setInjectorId)),
    load: typedValue<number>(fields, draftField.load(setInjectorId)) ?? 1,
    readings,
    checks: readChecks(fields, setInjectorId),
  };
}

/** A value typed for the injector stands before the one typed for all. */
function readChecks(fields: DraftFields, setInjectorId: string): InjectorChecks {
  const own = <Value>(key: CheckKey) => typedValue<Value>(fields, draftField.check(setInjectorId, key));
  const withShared = (key: SharedCheckKey) =>
    own<number>(key) ?? typedValue<number>(fields, draftField.sharedCheck(key));
  const windingOhm = own<number>("windingOhm");
  const leakageMm3PerMin = own<number>("leakageMm3PerMin");
  const [wound, leaked] = [windingOhm !== null, leakageMm3PerMin !== null];
  return {
    windingOhm,
    leadOhm: wound ? withShared("leadOhm") : null,
    windingTemperatureC: wound ? withShared("windingTemperatureC") : null,
    insulationMegohm: own("insulationMegohm"),
    leakageMm3PerMin,
    leakagePressureKpa: leaked ? withShared("leakagePressureKpa") : null,
    leakageSeconds: leaked ? withShared("leakageSeconds") : null,
    sprayGrade: own("sprayGrade"),
    note: own("note") ?? "",
  };
}
