import type { CalibrationEnd, Collection, InstrumentKind, Phase, StaffRole } from "../../db/vocabulary";
import type { CycleFigures, FlowReference, SetVerdict } from "../../metrology/cycle/types";
import type { Verdict } from "../../metrology/uncertainty/decide";

/** Everything that was measured on a set and what follows from it: set page, certificate, CSV and JSON share it. */
export type SetResults = {
  setId: string;
  reference: FlowReference & { fluid: string };
  /** What the set is judged by: the class as it stands now. */
  toleranceClass: JudgedClass;
  /** The model's limit, or the class's where that is tighter. */
  leakageLimitMm3PerMin: number;
  /** The latest cycle of each phase; null when none is recorded. */
  asFound: PhaseResults | null;
  asLeft: PhaseResults | null;
  /** Cycles that a later one of the same phase has taken the place of, oldest first. */
  repeatedCycles: EarlierCycle[];
  /** Oldest first; a corrected run stands within the one that corrects it. */
  cleaningRuns: CleaningRun[];
  readingFiles: ReadingFile[];
};

export type JudgedClass = {
  toleranceClassId: string;
  toleranceClassRevisionId: string;
  name: string;
  revision: number;
  spreadLimits: { fromPulseWidthMs: number; spreadPercent: number }[];
  staticSpreadPercent: number | null;
  deadTimeRangeMs: number | null;
  resistanceRangeOhm: number | null;
  leakageLimitMm3PerMin: number | null;
};

export type Recorder = { personId: string; name: string; roles: StaffRole[] };

export type PhaseResults = {
  cycleId: string;
  phase: Phase;
  /** Counts the cycles of this phase. */
  number: number;
  /** When it was measured: calibrations are those in force at that moment. */
  measuredAt: Date;
  /** The revision that counts. */
  latest: CycleRevision;
  /** Newest first, each whole, so that differences can be shown. */
  earlierRevisions: CycleRevision[];
  /**
   * Of the injectors that are still in the set when as left, of all that were measured when as found. Widths are named as
   * they were set; lines are fitted on the timer's true widths.
   */
  figures: CycleFigures;
  findings: Finding[];
  verdict: SetVerdict;
  /** By position, then by tag. */
  injectors: MeasuredInjector[];
};

export type CycleRevision = {
  cycleRevisionId: string;
  revision: number;
  /** Null in the first. */
  reason: string | null;
  recordedBy: Recorder;
  recordedAt: Date;
  bench: { benchId: string; code: string; location: string };
  fluid: { fluidId: string; name: string; densityAt15GPerMl: number | null; expansionPerK: number | null };
  fluidTemperatureC: Condition;
  pressureKpa: Condition;
  driveVolts: Condition;
  driverKind: "saturated" | "peak and hold";
  periodMs: Condition;
  collects: Collection;
  repeatability: number;
  note: string;
  /** Doubtful readings that the technician recorded as read. */
  acknowledged: AcknowledgedFinding[];
  /** Cylinders or balances by channel, then the bench's instruments. */
  calibrations: UsedCalibration[];
  injectors: RecordedInjector[];
};

/** What the instrument showed, what is true by its calibration, and how sure that is (standard uncertainty). */
export type Condition = { indicated: number; value: number; standardUncertainty: number };

export type UsedCalibration = {
  calibrationId: string;
  instrumentId: string;
  instrumentCode: string;
  kind: InstrumentKind;
  /** Null for the bench's own gauge, thermometer, ohmmeter, timer and supply. */
  channelNumber: number | null;
  division: number;
  rangeHigh: number;
  reference: string;
  validFrom: Date;
  validUntil: Date;
  gain: number;
  offset: number;
  gainU: number;
  offsetU: number;
  /** A replaced one was in force in its time; a corrected or revoked one is not to be relied on. */
  endedAs: CalibrationEnd | null;
  endedAt: Date | null;
  endedReason: string | null;
};

export type RecordedReading = {
  /** As set; null when held open. */
  pulseWidthMs: number | null;
  pulseCount: number | null;
  openSeconds: number | null;
  repeat: number;
  /** mL or g as indicated. */
  amount: number;
};

export type InjectorChecks = {
  windingOhm: number | null;
  leadOhm: number | null;
  windingTemperatureC: number | null;
  insulationMegohm: number | null;
  leakageMm3PerMin: number | null;
  leakagePressureKpa: number | null;
  leakageSeconds: number | null;
  sprayGrade: "good" | "acceptable" | "poor" | "no spray" | null;
  note: string;
};

export type RecordedInjector = {
  setInjectorId: string;
  channelNumber: number;
  load: number;
  instrumentCode: string;
  readings: RecordedReading[];
  checks: InjectorChecks;
};

export type MeasuredInjector = RecordedInjector & {
  position: number;
  tag: string;
  serial: string | null;
  state: "in set" | "rejected" | "replaced";
  resistance: WindingResult | null;
};

/** Winding at 20 °C, judged against the model's band. A winding measured as found only counts as left too. */
export type WindingResult = {
  ohmsAt20C: number;
  expandedUncertainty: number;
  bandVerdict: Verdict;
  measured: Phase;
};

/** A reading that is in doubt, with the reason as a sentence. */
export type Finding = {
  key: string;
  kind: string;
  /** Null where the whole column or set is in doubt. */
  setInjectorId: string | null;
  /** The other one of two that look exchanged. */
  otherSetInjectorId?: string;
  /** As set; null where no single width is in doubt. */
  pulseWidthMs: number | null;
  sentence: string;
  acknowledged: boolean;
};

export type AcknowledgedFinding = { key: string; sentence: string };

export type EarlierCycle = {
  cycleId: string;
  phase: Phase;
  number: number;
  measuredAt: Date;
  /** Newest first. */
  revisions: CycleRevision[];
};

export type CleaningRun = {
  cleaningRunId: string;
  bath: string;
  detergentBatch: string;
  minutes: number;
  temperatureC: number;
  backFlushed: boolean;
  partsRenewed: string[];
  note: string;
  correctionReason: string | null;
  recordedBy: Recorder;
  recordedAt: Date;
  /** What this entry corrects, newest first. */
  corrects: Omit<CleaningRun, "corrects">[];
};

export type ReadingFile = {
  readingFileId: string;
  name: string;
  rows: number;
  sizeBytes: number;
  sha256: string;
  sentBy: string;
  sentAt: Date;
};

/** Deviations from the set's mean static flow in percent, one per place in the set; null where nothing is known. */
export type RailStripValues = {
  found: (number | null)[];
  left: (number | null)[];
  /** Half of the class's limit on the static spread. */
  halfLimitPercent: number | null;
};
