import type { Collection, InstrumentKind } from "../../../db/vocabulary";
import type { InjectorChecks } from "../results";

export type DriverKind = "saturated" | "peak and hold";

/** A calibration that is in force at the moment asked for. */
export type CalibrationInForce = {
  calibrationId: string;
  reference: string;
  validUntil: string;
  gain: number;
  offset: number;
  gainU: number;
  offsetU: number;
};

export type BenchInstrument = {
  instrumentId: string;
  code: string;
  kind: InstrumentKind;
  division: number;
  rangeHigh: number;
  calibration: CalibrationInForce | null;
  /** When the last calibration went out of force; null when there never was one. */
  lapsedAt: string | null;
};

/** A bench as a cycle uses it. */
export type CycleBench = {
  benchId: string;
  code: string;
  location: string;
  collects: Collection;
  repeatability: number;
  fluidId: string;
  driveVolts: number;
  driverKind: DriverKind;
  periodMs: number;
  holdReason: string | null;
  retired: boolean;
  channels: { channelId: string; number: number; instrument: BenchInstrument | null }[];
  instruments: BenchInstrument[];
};

export type SheetInjector = { setInjectorId: string; position: number; tag: string; serial: string | null };

export type SheetColumn = {
  id: string;
  heldOpen: boolean;
  pulseWidthMs: number | null;
  pulseCount: number | null;
  openSeconds: number | null;
};

export type SheetReading = { columnId: string; repeat: number; amount: number };

export type SheetRow = {
  setInjectorId: string;
  tag: string;
  channelNumber: number | null;
  load: number;
  readings: SheetReading[];
  checks: InjectorChecks;
};

/** The sheet as read from what was typed; what is missing or wrong is null. */
export type Sheet = {
  benchId: string | null;
  fluidId: string | null;
  fluidTemperatureC: number | null;
  pressureKpa: number | null;
  driveVolts: number | null;
  driverKind: DriverKind | null;
  periodMs: number | null;
  note: string;
  repeats: number;
  columns: SheetColumn[];
  rows: SheetRow[];
};

/** Sentences by field of the draft. */
export type SheetProblems = Record<string, string[]>;
