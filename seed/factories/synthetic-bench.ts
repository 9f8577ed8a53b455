import type { CycleBench } from "../../src/data/cycles/sheet/types";
import { fluidDensity } from "../../src/metrology/fluids/fluid-density";
import { uniformGenerator } from "../../src/metrology/uncertainty/uniform-generator";

/**
 * Synthetic readings with a stated truth. An injector's truth holds at its model's rated pressure with n-heptane at
 * 20 °C; a bench turns it into what its cylinders would show. Nothing here was measured by anybody.
 */
export type InjectorTruth = {
  staticMlPerMin: number;
  deadTimeMs: number;
  /** What the needle's flight takes from a pulse that is hardly longer than the dead time, µL. */
  shortPulseLossUl: number;
  ohmsAt20C: number;
  leakageMm3PerMin: number;
  sprayGrade: "good" | "acceptable" | "poor";
};

export type Run = {
  temperatureC: number;
  pressureKpa: number;
  reference: { pressureKpa: number; densityGPerMl: number };
  widths: readonly { pulseWidthMs: number; pulseCount: number }[];
  heldOpenSeconds: number | null;
};

export type Indicated = { amounts: number[]; heldOpen: number | null };

const flightMs = 0.35;

/** µL per pulse at the conditions of the truth: the flow line, bent down at its foot. */
export function trueVolumePerPulse(truth: InjectorTruth, pulseWidthMs: number): number {
  const open = pulseWidthMs - truth.deadTimeMs;
  const line = (truth.staticMlPerMin / 60) * open;
  return Math.max(0, line - truth.shortPulseLossUl * Math.exp(-open / flightMs));
}

type Cylinder = Pick<CycleBench, "collects" | "repeatability"> & {
  channel: { gain: number; offset: number; division: number };
};

/** What the technician reads: true volume, less its conditions, through the channel's calibration, to the division. */
export function indicatedBy(
  { channel, collects, repeatability }: Cylinder,
  truth: InjectorTruth,
  run: Run,
  normal: () => number,
): Indicated {
  const density = fluidDensity("n-heptane", run.temperatureC);
  const toConditions =
    Math.sqrt(run.reference.densityGPerMl / density) * Math.sqrt(run.pressureKpa / run.reference.pressureKpa);
  const read = (ml: number) => {
    const amount = (collects === "mass" ? ml * density : ml) + repeatability * normal();
    const shown = (amount - channel.offset) / channel.gain;
    const divisions = Math.max(0, Math.round(shown / channel.division));
    return Number((divisions * channel.division).toFixed(6));
  };
  const perPulse = (width: number) => trueVolumePerPulse(truth, width) * toConditions;
  return {
    amounts: run.widths.map(({ pulseWidthMs, pulseCount }) =>
      read((perPulse(pulseWidthMs) * pulseCount) / 1000),
    ),
    heldOpen:
      run.heldOpenSeconds === null
        ? null
        : read((truth.staticMlPerMin * toConditions * run.heldOpenSeconds) / 60),
  };
}

/** Standard normal draws one by one, the same for the same seed (Box and Muller 1958). */
export function normalsFrom(seed: number): () => number {
  const uniform = uniformGenerator(seed);
  return () => Math.sqrt(-2 * Math.log(1 - uniform())) * Math.cos(2 * Math.PI * uniform());
}

export type SetTruth = { asFound: InjectorTruth[]; asLeft: InjectorTruth[] };

type Model = { ratedFlowMlPerMin: number; ohms: number };

/** A set that came in dirty and leaves clean: deposits take flow and some dead time, cleaning gives both back. */
export function makeSetTruth(seed: number, count: number, { ratedFlowMlPerMin, ohms }: Model): SetTruth {
  const normal = normalsFrom(seed);
  const uniform = uniformGenerator(seed + 1);
  const asLeft = Array.from({ length: count }, (): InjectorTruth => {
    return {
      staticMlPerMin: ratedFlowMlPerMin * (1 + 0.0022 * normal()),
      deadTimeMs: 0.92 + 0.006 * normal(),
      shortPulseLossUl: 0.0006 * ratedFlowMlPerMin * (1 + 0.1 * normal()),
      ohmsAt20C: ohms * (1 + 0.005 * normal()),
      leakageMm3PerMin: Number((0.6 * uniform()).toFixed(1)),
      sprayGrade: "good",
    };
  });
  const asFound = asLeft.map((clean, index): InjectorTruth => {
    const dirt = uniform() < 0.3 ? 0.03 + 0.03 * uniform() : 0.012 * uniform();
    return {
      ...clean,
      staticMlPerMin: clean.staticMlPerMin * (1 - dirt),
      deadTimeMs: clean.deadTimeMs + 0.2 * dirt + 0.004 * Math.abs(normal()),
      leakageMm3PerMin: Number((clean.leakageMm3PerMin + 2.2 * uniform() * uniform()).toFixed(1)),
      sprayGrade: dirt > 0.03 ? "poor" : index % 3 === 0 ? "acceptable" : "good",
    };
  });
  return { asFound, asLeft };
}
