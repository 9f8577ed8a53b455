import type { Collection, InstrumentKind } from "../../../db/vocabulary";
import type { CycleConditions, CycleInput, FlowReference, Reading } from "../../../metrology/cycle/types";
import type { Fluid } from "../../../metrology/fluids/fluid-density";
import type { RecordedReading } from "../results";
import { conditionOf } from "./condition";
import type { DriverKind } from "./types";

export type Calibrated = {
  division: number;
  rangeHigh: number;
  calibration: { gain: number; offset: number; gainU: number; offsetU: number } | null;
};

/** A cycle as its instruments showed it, typed or recorded, with the calibrations that make it true. */
export type Run = {
  fluid: Fluid;
  fluidTemperatureC: number;
  pressureKpa: number;
  driveVolts: number;
  driverKind: DriverKind;
  periodMs: number;
  collects: Collection;
  repeatability: number;
  instruments: Partial<Record<InstrumentKind, Calibrated>>;
  injectors: { setInjectorId: string; channel: Calibrated; readings: RecordedReading[] }[];
};

export function fluidOf(fluid: {
  name: string;
  densityAt15GPerMl: number | null;
  expansionPerK: number | null;
}): Fluid {
  const { name, densityAt15GPerMl, expansionPerK } = fluid;
  if (densityAt15GPerMl === null || expansionPerK === null) return "n-heptane";
  return { name, densityAt15GPerMl, expansionPerK };
}

const noCalibration = { gain: 1, offset: 0, gainU: 0, offsetU: 0 };

/** The run as the arithmetic wants it: conditions and pulse widths true by their instruments' calibrations. */
export function cycleInputOf(run: Run, reference: FlowReference): CycleInput {
  return {
    conditions: trueConditions(run),
    reference,
    injectors: run.injectors.map(({ setInjectorId, channel, readings }) => ({
      injectorId: setInjectorId,
      channel: { division: channel.division, calibration: channel.calibration ?? noCalibration },
      readings: readings.map((reading) => trueReading(run, reading)),
    })),
  };
}

function trueConditions(run: Run): CycleConditions {
  const { instruments } = run;
  const pressure = conditionOf(instruments["pressure gauge"], run.pressureKpa);
  const temperature = conditionOf(instruments.thermometer, run.fluidTemperatureC);
  return {
    fluid: run.fluid,
    fluidTemperatureC: temperature.value,
    pressureKpa: pressure.value,
    driveVolts: conditionOf(instruments["drive supply"], run.driveVolts).value,
    driverKind: run.driverKind,
    periodMs: trueWidth(run, run.periodMs),
    collects: run.collects,
    repeatability: run.repeatability,
    shared: {
      pressureKpa: pressure.standardUncertainty,
      fluidTemperatureC: temperature.standardUncertainty,
      pulseWidthMs: conditionOf(instruments["pulse timer"], typicalWidth(run)).standardUncertainty,
    },
  };
}

/** The timer's uncertainty grows with the width; the middle of those measured stands for all. */
function typicalWidth(run: Run): number {
  const widths = run.injectors.flatMap(({ readings }) =>
    readings.map((reading) => reading.pulseWidthMs ?? 0),
  );
  const pulsed = widths.filter((width) => width > 0).sort((a, b) => a - b);
  return pulsed[Math.floor(pulsed.length / 2)] ?? 0;
}

export function trueWidth(run: Run, setWidthMs: number): number {
  return conditionOf(run.instruments["pulse timer"], setWidthMs).value;
}

function trueReading(run: Run, reading: RecordedReading): Reading {
  const { pulseWidthMs, pulseCount, openSeconds, amount } = reading;
  if (pulseWidthMs === null || pulseCount === null)
    return { kind: "held open", openSeconds: openSeconds ?? 0, amount };
  return { kind: "dynamic", pulseWidthMs: trueWidth(run, pulseWidthMs), pulseCount, amount };
}
