import "server-only";
import { asc, inArray } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { calibrations } from "../../db/schema/calibrations";
import { refused } from "../access/errors";
import type { UsedCalibration } from "../cycles/results";

/**
 * Holds every calibration that the results rest on until the certificate stands: a revocation waits, or was first and is
 * seen here.
 */
export async function lockCalibrations(transaction: Transaction, used: UsedCalibration[]): Promise<void> {
  const ids = [...new Set(used.map((calibration) => calibration.calibrationId))];
  const rows = await transaction
    .select({ id: calibrations.id, endedAs: calibrations.endedAs, endedReason: calibrations.endedReason })
    .from(calibrations)
    .where(inArray(calibrations.id, ids))
    .orderBy(asc(calibrations.id))
    .for("share");
  // One that was replaced in its time stays what these results rest on.
  const lost = rows.filter(({ endedAs }) => endedAs === "revoked" || endedAs === "corrected");
  const reasons = new Map(lost.map((row) => [row.id, `${row.endedAs}: ${row.endedReason}`]));
  const missing = used
    .filter(({ calibrationId }) => reasons.has(calibrationId))
    .map((ended) => `${ended.instrumentCode}, ${ended.reference}: ${reasons.get(ended.calibrationId)}`);
  if (missing.length > 0)
    throw refused("A calibration that these results rest on is no longer in force.", [...new Set(missing)]);
}
