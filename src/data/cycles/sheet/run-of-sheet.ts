import type { FlowReference } from "../../../metrology/cycle/types";
import type { RecordedReading } from "../results";
import { instrumentOf } from "./missing-calibrations";
import { type Calibrated, fluidOf, type Run } from "./run";
import type { CycleBench, Sheet, SheetRow } from "./types";

export type SheetFluid = {
  fluidId: string;
  name: string;
  densityAt15GPerMl: number | null;
  expansionPerK: number | null;
};

type Beside = { bench: CycleBench; fluids: SheetFluid[]; reference: FlowReference };

/** A row's amounts with their columns; a column that is not complete yet gives none. */
export function readingsOf(sheet: Sheet, row: SheetRow): RecordedReading[] {
  return row.readings.flatMap(({ columnId, repeat, amount }) => {
    const column = sheet.columns.find((candidate) => candidate.id === columnId);
    if (!column) return [];
    const { heldOpen, pulseWidthMs, pulseCount, openSeconds } = column;
    const complete = heldOpen ? openSeconds !== null : pulseWidthMs !== null && pulseCount !== null;
    return complete ? [{ pulseWidthMs, pulseCount, openSeconds, repeat, amount }] : [];
  });
}

/** Which conditions are not typed yet; until they are, the rated pressure and 20 °C stand for them. */
export function assumedConditions(sheet: Sheet): ("pressure" | "temperature")[] {
  return [
    ...(sheet.pressureKpa === null ? (["pressure"] as const) : []),
    ...(sheet.fluidTemperatureC === null ? (["temperature"] as const) : []),
  ];
}

/** The sheet as far as it is typed, as a run that can be evaluated. */
export function runOfSheet(sheet: Sheet, { bench, fluids, reference }: Beside): Run {
  const fluid = fluids.find((candidate) => candidate.fluidId === (sheet.fluidId ?? bench.fluidId));
  const kinds = ["pressure gauge", "thermometer", "pulse timer", "ohmmeter", "drive supply"] as const;
  return {
    fluid: fluid ? fluidOf(fluid) : "n-heptane",
    fluidTemperatureC: sheet.fluidTemperatureC ?? 20,
    pressureKpa: sheet.pressureKpa ?? reference.pressureKpa,
    driveVolts: sheet.driveVolts ?? bench.driveVolts,
    driverKind: sheet.driverKind ?? bench.driverKind,
    periodMs: sheet.periodMs ?? bench.periodMs,
    collects: bench.collects,
    repeatability: bench.repeatability,
    instruments: Object.fromEntries(
      kinds.flatMap((kind) => {
        const instrument = instrumentOf(bench, kind);
        return instrument ? [[kind, instrument]] : [];
      }),
    ),
    injectors: sheet.rows.map((row) => ({
      setInjectorId: row.setInjectorId,
      channel: channelOf(bench, row),
      readings: readingsOf(sheet, row),
    })),
  };
}

function channelOf(bench: CycleBench, row: SheetRow): Calibrated {
  const channel = bench.channels.find((candidate) => candidate.number === row.channelNumber);
  const stand = channel?.instrument ?? bench.channels[0]?.instrument;
  return stand ?? { division: 0, rangeHigh: Number.POSITIVE_INFINITY, calibration: null };
}
