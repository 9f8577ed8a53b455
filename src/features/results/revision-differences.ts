import type { CycleRevision, InjectorChecks, RecordedInjector, RecordedReading } from "@/data/cycles/results";
import { formatNumber } from "@/format/format-number";
import type { Quantity } from "@/format/quantities";

export type Difference = { what: string; before: string; after: string };

/** What one revision of a cycle changed against the one before it. */
export function differencesBetween(
  before: CycleRevision,
  after: CycleRevision,
  tagOf: (setInjectorId: string) => string,
): Difference[] {
  const left = statementsOf(before, tagOf);
  const right = statementsOf(after, tagOf);
  return [...new Set([...left.keys(), ...right.keys()])].flatMap((what) => {
    const values = { before: left.get(what) ?? "–", after: right.get(what) ?? "–" };
    return values.before === values.after ? [] : [{ what, ...values }];
  });
}

/** Everything that a revision states, each under the words that name it. */
function statementsOf(revision: CycleRevision, tagOf: (id: string) => string): Map<string, string> {
  return new Map([
    ["Bench", revision.bench.code],
    ["Fluid", revision.fluid.name],
    ["Fluid temperature, °C", formatNumber(revision.fluidTemperatureC.indicated, "temperature")],
    ["Pressure, kPa", formatNumber(revision.pressureKpa.indicated, "pressure")],
    ["Drive voltage, V", formatNumber(revision.driveVolts.indicated, "voltage")],
    ["Driver", revision.driverKind],
    ["Period, ms", formatNumber(revision.periodMs.indicated, "period")],
    ["Note", revision.note],
    ...revision.injectors.flatMap((injector) =>
      ofInjector(injector, tagOf(injector.setInjectorId), revision),
    ),
  ]);
}

function ofInjector(
  injector: RecordedInjector,
  tag: string,
  { collects }: CycleRevision,
): [string, string][] {
  const amount = collects === "volume" ? "collectedVolume" : "collectedMass";
  return [
    [`${tag}, channel`, String(injector.channelNumber)],
    ...injector.readings.flatMap((reading) => ofReading(reading, tag, amount)),
    ...ofChecks(injector.checks, tag),
  ];
}

function ofReading(reading: RecordedReading, tag: string, amount: Quantity): [string, string][] {
  const { pulseWidthMs, pulseCount, openSeconds, repeat } = reading;
  const width = pulseWidthMs === null ? "held open" : `${formatNumber(pulseWidthMs, "pulseWidth")} ms`;
  const name = `${tag}, ${width}, reading ${repeat}`;
  const run =
    pulseCount === null
      ? `over ${formatNumber(openSeconds, "openTime")} s`
      : `over ${formatNumber(pulseCount, "pulseCount")} pulses`;
  return [[name, `${formatNumber(reading.amount, amount)} ${run}`]];
}

const checkNames: Partial<Record<keyof InjectorChecks, [string, Quantity]>> = {
  windingOhm: ["winding, Ω", "resistance"],
  leadOhm: ["lead, Ω", "resistance"],
  windingTemperatureC: ["winding temperature, °C", "temperature"],
  insulationMegohm: ["insulation, MΩ", "insulation"],
  leakageMm3PerMin: ["leakage, mm³/min", "leakage"],
  leakagePressureKpa: ["leakage pressure, kPa", "pressure"],
  leakageSeconds: ["leakage time, s", "openTime"],
};

function ofChecks(checks: InjectorChecks, tag: string): [string, string][] {
  const figures = Object.entries(checkNames).map(([field, [name, quantity]]): [string, string] => [
    `${tag}, ${name}`,
    formatNumber(checks[field as keyof InjectorChecks] as number | null, quantity),
  ]);
  return [...figures, [`${tag}, spray`, checks.sprayGrade ?? "–"], [`${tag}, note`, checks.note || "–"]];
}
