import {
  checkKeys,
  type DraftFields,
  draftField,
  heldOpenColumn,
  sharedCheckKeys,
  widthColumnId,
} from "../draft-fields";
import type { CycleRevision } from "../results";
import type { CycleBench, SheetInjector } from "./types";

type TestPlan = {
  widths: { pulseWidthMs: number; pulseCount: number }[];
  heldOpenSeconds: number | null;
};

/** The columns of the lab's test plan. */
export function columnsOfPlan(plan: TestPlan): DraftFields {
  const fields: DraftFields = {};
  for (const [index, width] of plan.widths.entries()) setColumn(fields, widthColumnId(index + 1), width);
  if (plan.heldOpenSeconds !== null)
    fields[draftField.column(heldOpenColumn, "openSeconds")] = String(plan.heldOpenSeconds);
  return fields;
}

function setColumn(
  fields: DraftFields,
  columnId: string,
  { pulseWidthMs, pulseCount }: { pulseWidthMs: number; pulseCount: number },
): void {
  fields[draftField.column(columnId, "pulseWidthMs")] = String(pulseWidthMs);
  fields[draftField.column(columnId, "pulseCount")] = String(pulseCount);
}

/** What a bench's record gives a new cycle; fluid temperature and pressure are read anew each time. */
export function conditionsOfBench(bench: CycleBench): DraftFields {
  return {
    benchId: bench.benchId,
    fluidId: bench.fluidId,
    [draftField.condition("driveVolts")]: String(bench.driveVolts),
    [draftField.condition("driverKind")]: bench.driverKind,
    [draftField.condition("periodMs")]: String(bench.periodMs),
  };
}

/** Injectors by place into the channels that are in calibration, in as many loads as it takes. */
export function placesOnBench(injectors: SheetInjector[], bench: CycleBench): DraftFields {
  const usable = bench.channels.filter((channel) => channel.instrument?.calibration);
  const channels = usable.length > 0 ? usable : bench.channels;
  const fields: DraftFields = {};
  if (channels.length === 0) return fields;
  for (const [index, { setInjectorId }] of injectors.entries()) {
    fields[draftField.channel(setInjectorId)] = String(channels[index % channels.length]!.number);
    fields[draftField.load(setInjectorId)] = String(Math.floor(index / channels.length) + 1);
  }
  return fields;
}

/** Bench, drive, columns and channels as in an earlier cycle, for injectors that are still there. */
export function planOfRevision(
  revision: CycleRevision,
  injectors: Pick<SheetInjector, "setInjectorId">[],
): DraftFields {
  const present = new Set(injectors.map((injector) => injector.setInjectorId));
  const kept = revision.injectors.filter((injector) => present.has(injector.setInjectorId));
  return {
    benchId: revision.bench.benchId,
    fluidId: revision.fluid.fluidId,
    [draftField.condition("driveVolts")]: String(revision.driveVolts.indicated),
    [draftField.condition("driverKind")]: revision.driverKind,
    [draftField.condition("periodMs")]: String(revision.periodMs.indicated),
    ...columnsOfRevision(revision).fields,
    ...Object.fromEntries(
      kept.map((row) => [draftField.channel(row.setInjectorId), String(row.channelNumber)]),
    ),
    ...Object.fromEntries(kept.map((row) => [draftField.load(row.setInjectorId), String(row.load)])),
  };
}

/** The whole sheet as it was recorded, to be corrected. */
export function fieldsOfRevision(revision: CycleRevision): DraftFields {
  const { columnOf } = columnsOfRevision(revision);
  const fields = { ...planOfRevision(revision, revision.injectors), ...sharedChecks(revision) };
  fields[draftField.condition("fluidTemperatureC")] = String(revision.fluidTemperatureC.indicated);
  fields[draftField.condition("pressureKpa")] = String(revision.pressureKpa.indicated);
  fields.note = revision.note;
  for (const { setInjectorId, readings, checks } of revision.injectors) {
    for (const { pulseWidthMs, repeat, amount } of readings)
      fields[draftField.reading(setInjectorId, columnOf(pulseWidthMs), repeat)] = String(amount);
    for (const key of checkKeys)
      if (checks[key] !== null && fields[`checks.${key}`] !== String(checks[key]))
        fields[draftField.check(setInjectorId, key)] = String(checks[key]);
  }
  return withoutEmpty(fields);
}

/** What the first injector was checked at stands for all; others keep their own where it differs. */
function sharedChecks(revision: CycleRevision): DraftFields {
  const fields: DraftFields = {};
  for (const key of sharedCheckKeys) {
    const value = revision.injectors.find(({ checks }) => checks[key] !== null)?.checks[key];
    if (value !== undefined && value !== null) fields[draftField.sharedCheck(key)] = String(value);
  }
  return fields;
}

function columnsOfRevision(revision: CycleRevision) {
  const readings = revision.injectors.flatMap((injector) => injector.readings);
  const counts = new Map(readings.map((reading) => [reading.pulseWidthMs, reading]));
  const widths = [...counts.keys()].filter((width) => width !== null).sort((a, b) => a - b);
  const columnOf = (width: number | null) =>
    width === null ? heldOpenColumn : widthColumnId(widths.indexOf(width) + 1);
  const fields: DraftFields = {};
  for (const pulseWidthMs of widths) {
    const pulseCount = counts.get(pulseWidthMs)?.pulseCount ?? 0;
    setColumn(fields, columnOf(pulseWidthMs), { pulseWidthMs, pulseCount });
  }
  const heldOpen = counts.get(null);
  if (heldOpen) fields[draftField.column(heldOpenColumn, "openSeconds")] = String(heldOpen.openSeconds);
  return { fields, columnOf };
}

export function withoutEmpty(fields: DraftFields): DraftFields {
  return Object.fromEntries(Object.entries(fields).filter(([, text]) => text !== ""));
}
