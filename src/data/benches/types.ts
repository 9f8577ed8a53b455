import type { CalibrationEnd, Collection, driverKinds, InstrumentKind } from "../../db/vocabulary";

export type BenchState = "in calibration" | "due" | "overdue" | "on hold" | "retired";

/** What everybody in the lab may know of a bench. */
export type BenchStatus = {
  benchId: string;
  code: string;
  location: string;
  state: BenchState;
  /** How long every instrument on it stays in calibration; null when one is out already. */
  calibratedUntil: Date | null;
};

/** `detail` is null for whoever sees the status alone. */
export type BenchRow = BenchStatus & {
  detail: {
    collects: Collection;
    channelCount: number;
    holdReason: string | null;
    /** Codes of the instruments that are out of calibration. */
    outOfCalibration: string[];
  } | null;
};

/** `detail` is null for whoever sees the status alone. */
export type BenchPage = BenchStatus & { detail: BenchDetail | null };

export type BenchDetail = {
  version: number;
  collects: Collection;
  repeatability: number;
  fluidId: string;
  fluidName: string;
  driveVolts: number;
  driverKind: (typeof driverKinds)[number];
  periodMs: number;
  hold: { reason: string; by: string; at: Date } | null;
  /** Holds that are over, newest first. */
  earlierHolds: EarlierBenchHold[];
  /** Channels by number, then the bench's own instruments. */
  places: BenchPlace[];
  /** Instruments that were on this bench before, newest first. */
  earlierInstruments: EarlierInstrument[];
};

export type BenchPlace = {
  channelId: string | null;
  channelNumber: number | null;
  kind: InstrumentKind;
  /** Null where a place is empty. */
  instrument: PlacedInstrument | null;
};

export type PlacedInstrument = {
  instrumentId: string;
  version: number;
  code: string;
  maker: string;
  serial: string;
  rangeHigh: number;
  division: number;
  intervalMonths: number;
  since: Date;
  calibratedUntil: Date | null;
  /** Newest first. */
  calibrations: InstrumentCalibration[];
};

export type InstrumentCalibration = {
  calibrationId: string;
  reference: string;
  validFrom: Date;
  validUntil: Date;
  inForce: boolean;
  gain: number;
  offset: number;
  gainU: number;
  offsetU: number;
  note: string;
  recordedBy: string;
  recordedAt: Date;
  corrects: { reference: string; reason: string } | null;
  ended: { as: CalibrationEnd; at: Date; by: string; reason: string } | null;
  /** Certificates whose figures rest on it. */
  certificates: RestingCertificate[];
};

export type RestingCertificate = { certificateId: string; number: string; state: string };

export type EarlierBenchHold = {
  reason: string;
  by: string;
  at: Date;
  clearedBy: string;
  clearedAt: Date;
  clearedReason: string;
};

export type EarlierInstrument = {
  instrumentId: string;
  code: string;
  channelNumber: number | null;
  since: Date;
  until: Date;
};
