import type { CycleFigures } from "./types";

/** What readings are held against besides themselves. */
export type CheckAgainst = {
  model?: { ratedFlowMlPerMin: number; ratedFlowBandPercent: number; ratedPressureKpa: number };
  /** Figures of an earlier cycle of the same set, to see whether two injectors were exchanged between the two. */
  earlier?: CycleFigures;
};

/**
 * A reading, column or injector in doubt, with the numbers that make it so. `injectorId` is null where a whole column is
 * meant; `pulseWidthMs` (as in the input) is null where no single width is, or the held-open column.
 */
export type Doubt =
  | OffTheLine
  | NotRising
  | DutyOver100
  | OutsideTheBand
  | OutlierAtWidth
  | ClosureOver5
  | ExchangedInColumn
  | ShiftedColumn
  | ColumnOfAnotherWidth
  | ExchangedInCycle;

export type OffTheLine = {
  kind: "off the line";
  injectorId: string;
  pulseWidthMs: number;
  /** Which of the repeats at this width, counted from 1. */
  repeat: number;
  volumePerPulseUl: number;
  /** What the injector's other widths predict here. */
  predictedUl: number;
  deviationPercent: number;
  /** The largest deviation that resolution, repeatability and the floor for sound injectors still explain. */
  explainedPercent: number;
};

export type NotRising = {
  kind: "not rising";
  injectorId: string;
  pulseWidthMs: number;
  volumePerPulseUl: number;
  shorterPulseWidthMs: number;
  shorterVolumePerPulseUl: number;
};

export type DutyOver100 = {
  kind: "duty over 100 %";
  injectorId: string;
  pulseWidthMs: number;
  periodMs: number;
  dutyPercent: number;
};

export type OutsideTheBand = {
  kind: "outside the model's band";
  injectorId: string;
  pulseWidthMs: null;
  mlPerMin: number;
  /** At the reference pressure. */
  ratedMlPerMin: number;
  deviationPercent: number;
  bandPercent: number;
};

export type OutlierAtWidth = {
  kind: "outlier at a width";
  injectorId: string;
  /** The width where it stands out most. */
  pulseWidthMs: number;
  volumePerPulseUl: number;
  /** Against the mean of the others. */
  deviationPercent: number;
  statistic: number;
  critical: number;
  count: number;
  /** Grubbs' test has almost no power on four values or fewer: that it is silent there says nothing. */
  weak: boolean;
};

export type ClosureOver5 = {
  kind: "closure over 5 %";
  injectorId: string;
  pulseWidthMs: null;
  closurePercent: number;
};

export type ExchangedInColumn = {
  kind: "two injectors exchanged in a column";
  injectorId: string;
  otherInjectorId: string;
  pulseWidthMs: number | null;
  /** Of the two, as read and when exchanged, in percent of what their other readings predict. */
  deviationsPercent: [number, number];
  exchangedPercent: [number, number];
};

export type ShiftedColumn = {
  kind: "column shifted by an injector";
  injectorId: null;
  pulseWidthMs: number | null;
  /** 1: each reading belongs to the injector before; −1: to the injector after, in the order of the input. */
  shift: 1 | -1;
  /** Root mean square of the column's deviations as read and when shifted back. */
  deviationPercent: number;
  shiftedPercent: number;
};

export type ColumnOfAnotherWidth = {
  kind: "column of another pulse width";
  injectorId: null;
  pulseWidthMs: number;
  likelyPulseWidthMs: number;
  /** Median deviation of the column as read, and if it belongs to the other width. */
  deviationPercent: number;
  likelyPercent: number;
};

export type ExchangedInCycle = {
  kind: "two injectors exchanged in the cycle";
  injectorId: string;
  otherInjectorId: string;
  pulseWidthMs: null;
  /** Change of the static flow of the two since the earlier cycle, less that of the set, as recorded and if exchanged. */
  changesPercent: [number, number];
  exchangedPercent: [number, number];
};
