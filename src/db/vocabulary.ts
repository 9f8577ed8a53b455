/**
 * The closed lists of the trade's words that are stored as they are read. Browser-safe: forms offer the same lists.
 */
export const stages = [
  "checked in",
  "as found",
  "cleaning",
  "as left",
  "in review",
  "certified",
  "handed over",
  "returned uncleaned",
] as const;
/** Stages in which a set is worked on; from certified on its record is frozen. */
export const openStages = ["checked in", "as found", "cleaning", "as left", "in review"] as const;
export const phases = ["as found", "as left"] as const;
export const staffRoles = ["counter", "technician", "manager"] as const;
export const roles = [...staffRoles, "customer"] as const;
export const impedanceBands = ["high impedance", "low impedance"] as const;
export const driverKinds = ["saturated", "peak and hold"] as const;
export const collections = ["volume", "mass"] as const;
export const sprayTypes = ["single stream", "dual stream", "cone", "split cone"] as const;
export const sprayGrades = ["good", "acceptable", "poor", "no spray"] as const;
export const workItems = ["clean", "flow test", "winding check", "renew filters and seals", "match"] as const;
export const injectorConditions = [
  "sound",
  "dirty",
  "corroded",
  "damaged connector",
  "damaged body",
  "seized",
] as const;
export const injectorStates = ["in set", "rejected", "replaced"] as const;
export const renewableParts = ["inlet filter", "upper seal", "lower seal", "pintle cap", "spacer"] as const;
export const instrumentKinds = [
  "cylinder",
  "balance",
  "pressure gauge",
  "thermometer",
  "ohmmeter",
  "pulse timer",
  "drive supply",
] as const;
export const calibrationEnds = ["replaced", "corrected", "revoked"] as const;
export const handOverWays = ["collected", "courier", "post", "our delivery"] as const;
export const photoKinds = ["intake", "spray"] as const;
export const certificateStates = ["current", "superseded", "revoked"] as const;
export const paperSizes = ["A4", "Letter"] as const;

export type Stage = (typeof stages)[number];
export function isOpenStage(stage: Stage): boolean {
  return (openStages as readonly Stage[]).includes(stage);
}
export type Phase = (typeof phases)[number];
export type StaffRole = (typeof staffRoles)[number];
export type Role = (typeof roles)[number];
export type Collection = (typeof collections)[number];
export type InstrumentKind = (typeof instrumentKinds)[number];
export type CalibrationEnd = (typeof calibrationEnds)[number];
export type CertificateState = (typeof certificateStates)[number];
export type PaperSize = (typeof paperSizes)[number];
