import { formatRecordDayOf } from "../../../format/format-date";
import type { MissingCalibration } from "./missing-calibrations";

/** Which instrument is out of calibration, where, and since when. */
export function describeMissing({ place, code, lapsedAt }: MissingCalibration, zone: string): string {
  const where = place.charAt(0).toUpperCase() + place.slice(1);
  if (!code) return `${where}: the bench has none.`;
  if (!lapsedAt) return `${where}: ${code} has no calibration in force.`;
  return `${where}: ${code} is out of calibration since ${formatRecordDayOf(lapsedAt, zone)}.`;
}
