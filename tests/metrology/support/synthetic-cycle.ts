import { type ChannelCalibration, type CycleInput, fluidDensity } from "@/metrology";
import {
  type InjectorTruth,
  indicatedBy,
  makeSetTruth,
  normalsFrom,
} from "../../../seed/factories/synthetic-bench";

export type SyntheticCycle = { input: CycleInput; truths: InjectorTruth[] };

type Asked = {
  count?: number;
  state?: "asFound" | "asLeft";
  widths?: readonly number[];
  pulseCount?: number | ((pulseWidthMs: number) => number);
  repeats?: number;
  pressureKpa?: number;
  collects?: "volume" | "mass";
  /** Changes the truth before it is measured. */
  truly?: (truths: InjectorTruth[]) => InjectorTruth[];
};

export const usualWidths = [2, 2.5, 3, 4, 6, 10, 15];

/**
 * A cycle on an imaginary bench. What its records state is off the truth by draws of the uncertainties they state: rail
 * pressure, fluid temperature and timer for all channels alike, gain and offset for each channel.
 */
export function syntheticCycle(seed: number, asked: Asked = {}): SyntheticCycle {
  const { count = 8, state = "asLeft", collects = "volume", pressureKpa = 300, truly = (t) => t } = asked;
  const { widths = usualWidths, pulseCount = 800, repeats = 1 } = asked;
  const normal = normalsFrom(7919 * seed + 13);
  const truths = truly(makeSetTruth(seed, count, { ratedFlowMlPerMin: 440, ohms: 12 })[state]);
  const conditions: CycleInput["conditions"] = {
    fluid: "n-heptane",
    fluidTemperatureC: 21.5,
    pressureKpa,
    driveVolts: 14,
    driverKind: "saturated",
    periodMs: 20,
    collects,
    shared: { pressureKpa: 0.9, fluidTemperatureC: 0.1, pulseWidthMs: 0.0006 },
    repeatability: 0.03,
  };
  const reference = { pressureKpa: 300, densityGPerMl: fluidDensity("n-heptane", 20) };
  const timerError = conditions.shared.pulseWidthMs * normal();
  const countOf = (width: number) => (typeof pulseCount === "number" ? pulseCount : pulseCount(width));
  const run = {
    temperatureC: conditions.fluidTemperatureC + conditions.shared.fluidTemperatureC * normal(),
    pressureKpa: pressureKpa + conditions.shared.pressureKpa * normal(),
    reference,
    widths: widths.map((width) => ({ pulseWidthMs: width + timerError, pulseCount: countOf(width) })),
    heldOpenSeconds: 10,
  };
  const division = collects === "volume" ? 0.2 : 0.01;
  const injectors = truths.map((truth, place) => {
    const calibration: ChannelCalibration = {
      gain: 1 + 0.003 * normal(),
      offset: 0.05 * normal(),
      gainU: 0.0006,
      offsetU: 0.02,
    };
    const channel = {
      gain: calibration.gain + calibration.gainU * normal(),
      offset: calibration.offset + calibration.offsetU * normal(),
      division,
    };
    const readings = Array.from({ length: repeats }, () => {
      const bench = { channel, collects, repeatability: conditions.repeatability };
      const { amounts, heldOpen } = indicatedBy(bench, truth, run, normal);
      const pulsed = widths.map((pulseWidthMs, column) => ({
        kind: "dynamic" as const,
        pulseWidthMs,
        pulseCount: countOf(pulseWidthMs),
        amount: amounts[column]!,
      }));
      return [...pulsed, { kind: "held open" as const, openSeconds: run.heldOpenSeconds, amount: heldOpen! }];
    }).flat();
    return { injectorId: `injector ${place + 1}`, channel: { division, calibration }, readings };
  });
  return { input: { conditions, reference, injectors }, truths };
}
