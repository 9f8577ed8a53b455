import type { CycleFigures, SetVerdict } from "../../metrology/cycle/types";
import type { Verdict } from "../../metrology/uncertainty/decide";

/** ISO 8601 with an offset or Z, as `Date.prototype.toISOString` writes it. */
export type Instant = string;

/**
 * The whole of what a matched-set certificate says, as plain JSON: no undefined, no Date. Figures keep their full precision
 * here; only src/format rounds them, so that the page, the PDF and the data sheet write the same digits.
 */
export type CertificateContent = {
  /** Counts up when the shape changes, so that what was stored earlier can still be read. */
  format: 1;
  paperSize: "A4" | "Letter";
  certificate: CertificateIdentity;
  lab: LabIdentity;
  customer: { name: string; contactName: string; address: string };
  /** What the lab did not find out for itself; printed as the customer's own words. */
  suppliedByCustomer: { label: string; text: string }[];
  set: SetIdentity;
  model: CertifiedModel;
  /** By position, then by tag; rejected and replaced ones included. */
  injectors: CertifiedInjector[];
  /** What flows are stated for. */
  reference: { pressureKpa: number; densityGPerMl: number; fluid: string };
  toleranceClass: CertifiedClass;
  asFound: CertifiedPhase;
  asLeft: CertifiedPhase;
  cleaningRuns: CertifiedCleaning[];
  photos: CertifiedPhoto[];
  /** Paragraphs; `describeMethod` writes the lab's usual ones. */
  method: string[];
  /** Additions to, deviations from and exclusions of the method, corrections, doubtful readings kept as read. */
  deviations: string[];
  /** The releaser's remarks; "" when there are none. */
  remarks: string;
  /** Results that came from somebody else; empty when all are the lab's own. */
  externallyProvided: string[];
  /** `standingStatements` and `standingCautions` write the usual ones. */
  statements: string[];
  cautions: string[];
  testedBy: Signature[];
  releasedBy: Signature;
  /** Printed in words: the lab lets one person test and release. */
  onePersonTestedAndReleased: boolean;
};

export type CertificateIdentity = {
  /** C26-0087/1 */
  number: string;
  revision: number;
  issuedAt: Instant;
  replaces: { number: string; reason: string } | null;
  verificationCode: string;
  /** Printed as a QR code and as the only link; null while the lab offers no such page. */
  verificationUrl: string | null;
  /** Newest entry of the activity record at issue, hex. */
  recordSha256: string;
  programVersion: string;
};

export type LabIdentity = {
  name: string;
  address: string;
  phone: string;
  email: string;
  timeZone: string;
  /** As the lab entered it; nothing of accreditation is printed when "". */
  accreditation: string;
  /** The lab's own paragraph; "" when there is none. */
  wording: string;
  /** Where the work was done. */
  placeOfWork: string;
};

export type SetIdentity = {
  number: string;
  workAsked: string[];
  receivedAt: Instant;
};

export type CertifiedModel = {
  make: string;
  partNumber: string;
  impedanceBand: string;
  resistanceLowOhm: number;
  resistanceHighOhm: number;
  ratedFlowMlPerMin: number;
  ratedFlowBandPercent: number;
  ratedPressureKpa: number;
  leakageLimitMm3PerMin: number;
  leakagePressureKpa: number;
  sprayType: string;
};

export type CertifiedInjector = {
  /** The same as in `figures.injectors[].injectorId`. */
  injectorId: string;
  position: number;
  tag: string;
  serial: string | null;
  marking: string;
  /** As received. */
  condition: string;
  conditionNote: string;
  state: "in set" | "rejected" | "replaced";
  /** Why it was rejected; null while it is in the set. */
  stateReason: string | null;
  replacesTag: string | null;
};

export type CertifiedClass = {
  name: string;
  revision: number;
  spreadLimits: { fromPulseWidthMs: number; spreadPercent: number }[];
  staticSpreadPercent: number | null;
  deadTimeRangeMs: number | null;
  resistanceRangeOhm: number | null;
  /** The class's or the model's, whichever is tighter. */
  leakageLimitMm3PerMin: number;
};

/** A condition brought to its true value by the instrument's calibration. */
export type CertifiedCondition = { value: number; standardUncertainty: number };

export type CertifiedPhase = {
  measuredAt: Instant;
  /** Counts the cycles of this phase, and the revisions of this cycle. */
  cycleNumber: number;
  revision: number;
  bench: { code: string; location: string };
  fluid: string;
  fluidTemperatureC: CertifiedCondition;
  pressureKpa: CertifiedCondition;
  driveVolts: CertifiedCondition;
  periodMs: CertifiedCondition;
  driverKind: "saturated" | "peak and hold";
  collects: "volume" | "mass";
  /** What was run: as commanded. */
  widths: { pulseWidthMs: number; pulseCount: number; repeats: number }[];
  heldOpenSeconds: number | null;
  figures: CycleFigures;
  verdict: SetVerdict;
  /** One per injector of `figures`. */
  checks: CertifiedChecks[];
  /** Empty with fewer than two injectors that have a line. */
  fuelError: FuelError;
  /** Extra on-time below the linear range: one entry per injector and measured width. */
  shortPulseAdders: { injectorId: string; pulseWidthMs: number; adderMs: number }[];
  deadTimesByVoltage: {
    injectorId: string;
    volts: number;
    deadTimeMs: number;
    deadTimeSeMs: number | null;
  }[];
  calibrations: CertifiedCalibration[];
  note: string;
};

export type CertifiedChecks = {
  injectorId: string;
  channelNumber: number;
  load: number;
  resistance: { ohmsAt20C: number; expandedUncertainty: number; bandVerdict: Verdict } | null;
  insulationMegohm: number | null;
  leakage: { mm3PerMin: number; pressureKpa: number; seconds: number } | null;
  sprayGrade: string | null;
  note: string;
};

/** Each injector's percent error from the set's mean fuel, at the same pulse widths for all. */
export type FuelError = {
  pulseWidthsMs: number[];
  injectors: { injectorId: string; errorPercent: number[] }[];
};

export type CertifiedCalibration = {
  instrumentCode: string;
  kind: string;
  /** Null for what belongs to the whole bench. */
  channelNumber: number | null;
  reference: string;
  validFrom: Instant;
  validUntil: Instant;
};

export type CertifiedCleaning = {
  recordedAt: Instant;
  recordedBy: string;
  bath: string;
  detergentBatch: string;
  minutes: number;
  temperatureC: number;
  backFlushed: boolean;
  partsRenewed: string[];
};

/** A spray photo; its JPEG bytes are handed to the renderer apart, keyed by this hash. */
export type CertifiedPhoto = {
  sha256: string;
  injectorId: string;
  phase: "as found" | "as left";
  takenAt: Instant;
};

export type Signature = {
  name: string;
  /** Manager, technician … as held when signing. */
  role: string;
  at: Instant;
  /** What the signature means: "measured as found", "reviewed the results and released this certificate". */
  meaning: string;
};
