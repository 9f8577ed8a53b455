import "server-only";

export { correctCalibration } from "./correct-calibration";
export { recordCalibrations } from "./record-calibrations";
export { revokeCalibration } from "./revoke-calibration";
