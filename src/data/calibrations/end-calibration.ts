import "server-only";
import { eq } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { recordNow } from "../../db/columns";
import { calibrations } from "../../db/schema/calibrations";
import type { CalibrationEnd } from "../../db/vocabulary";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";

type Ending = { as: CalibrationEnd; reason: string; at?: Date };

/** A calibration goes out of force before its day, now or at the moment it was replaced: who and why stay on it. */
export async function endCalibration(
  transaction: Transaction,
  context: Context,
  calibrationId: string,
  { as, reason, at }: Ending,
): Promise<void> {
  await transaction
    .update(calibrations)
    .set({
      endedAs: as,
      endedAt: at ?? recordNow,
      endedBy: requirePerson(context).personId,
      endedReason: reason,
    })
    .where(eq(calibrations.id, calibrationId));
}
