import type { Fluid } from "../fluids/fluid-density";
import type { FlowLine } from "../line/fit-flow-line";
import type { Spread } from "../line/spread";
import type { Verdict } from "../uncertainty/decide";

/** The calibration of one channel's cylinder or balance that was in force: true = gain · indicated + offset. */
export type ChannelCalibration = {
  gain: number;
  /** mL for a cylinder, g for a balance. */
  offset: number;
  /** Standard uncertainties of gain (1) and offset (mL or g). */
  gainU: number;
  offsetU: number;
};

export type CycleChannel = {
  /** Smallest division of the cylinder in mL, or of the balance in g. */
  division: number;
  calibration: ChannelCalibration;
};

export type CycleConditions = {
  fluid: Fluid;
  fluidTemperatureC: number;
  /** Pressure across the injector. */
  pressureKpa: number;
  driveVolts: number;
  driverKind: "saturated" | "peak and hold";
  /** Time from one switch-on to the next. */
  periodMs: number;
  collects: "volume" | "mass";
  /** Standard uncertainties of what every channel of the run shares. They cancel in a spread. */
  shared: { pressureKpa: number; fluidTemperatureC: number; pulseWidthMs: number };
  /** Standard uncertainty of one collected amount from repeatability alone (mL or g), as the bench record states it. */
  repeatability: number;
};

/** What flows are brought to: the model's rated pressure, and a reference density such as n-heptane at 20 °C. */
export type FlowReference = { pressureKpa: number; densityGPerMl: number };

export type DynamicReading = {
  kind: "dynamic";
  pulseWidthMs: number;
  pulseCount: number;
  /** As read: mL in the cylinder, or g on the balance. */
  amount: number;
};
export type HeldOpenReading = { kind: "held open"; openSeconds: number; amount: number };
export type Reading = DynamicReading | HeldOpenReading;

export type CycleInjector = { injectorId: string; channel: CycleChannel; readings: Reading[] };

export type CycleInput = {
  conditions: CycleConditions;
  reference: FlowReference;
  injectors: CycleInjector[];
};

/** Flow per pulse at one pulse width: the mean of the repeats, at reference density (and pressure where it may be). */
export type WidthFlow = {
  pulseWidthMs: number;
  volumePerPulseUl: number;
  repeats: number;
  /** Standard uncertainty from what is this injector's own: resolution, repeatability, its channel's gain and offset. */
  ownU: number;
  dutyPercent: number;
};

export type ValueWithU = { value: number; expandedUncertainty: number; coverageFactor: number };

export type InjectorFigures = {
  injectorId: string;
  flows: WidthFlow[];
  /** Measured held open, mL/min at reference conditions; null when not measured. */
  heldOpen: { mlPerMin: number; ownU: number } | null;
  /** null with `lineProblem` when no line can be had; the sentence says why. */
  flowLine: FlowLine | null;
  lineProblem: string | null;
  /** slope · 60 with its expanded uncertainty (own and shared parts). */
  staticFlow: ValueWithU | null;
  /** Own standard uncertainty of the static flow, for spreads. */
  staticFlowOwnU: number | null;
  /** Line against held open, percent of held open; flagged over 5 %. */
  closurePercent: number | null;
};

export type SpreadWithInterval = Spread & {
  interval: { low: number; high: number };
  expandedUncertainty: number;
};

export type CycleFigures = {
  densityGPerMl: number;
  correction: {
    density: number;
    pressureStatic: number;
    pressureDynamic: number;
    dynamicWithinRange: boolean;
  };
  injectors: InjectorFigures[];
  /** One entry per pulse width that every injector has; null spread below two injectors. */
  widths: { pulseWidthMs: number; spread: SpreadWithInterval | null }[];
  staticSpread: SpreadWithInterval | null;
  heldOpenSpread: SpreadWithInterval | null;
  /** Plain range, ms. */
  deadTimeRange: { rangeMs: number; expandedUncertainty: number } | null;
};

/** What the lab calls a tolerance class. A limit that is null is not judged. */
export type ToleranceClass = {
  name: string;
  /** A limit holds from its pulse width up to the next one's. Spread is 100·(max − min)/mean. */
  spreadLimits: { fromPulseWidthMs: number; spreadPercent: number }[];
  staticSpreadPercent: number | null;
  deadTimeRangeMs: number | null;
  resistanceRangeOhm: number | null;
};

export type SetCriterion = {
  kind: "spread at width" | "static spread" | "dead-time range" | "resistance range" | "leakage";
  pulseWidthMs?: number;
  injectorId?: string;
  value: number | null;
  limit: number;
  expandedUncertainty: number;
  unit: "%" | "ms" | "Ω" | "mm³/min";
  /** null: could not be judged because a figure is missing. */
  verdict: Verdict | null;
};

/** One injector's winding at 20 °C. */
export type MeasuredResistance = { injectorId: string; ohmsAt20C: number; expandedUncertainty: number };
/** One injector's seat leakage; without an uncertainty it is judged as it stands. */
export type MeasuredLeakage = { injectorId: string; mm3PerMin: number; expandedUncertainty?: number };

export type SetVerdict = { criteria: SetCriterion[]; verdict: Verdict | null; decisionRule: string };
