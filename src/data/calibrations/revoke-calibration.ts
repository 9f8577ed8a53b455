import "server-only";
import type { Context } from "../access/actor";
import { refused } from "../access/errors";
import { certificatesResting } from "../benches";
import { write } from "../write";
import { endCalibration } from "./end-calibration";
import { revokeCalibrationInput } from "./inputs";
import { lockCalibration } from "./internal";

/**
 * It is not relied upon any more: no cycle and no certificate may rest on it, and those that do are named. One that was
 * replaced can still turn out to have been wrong.
 */
export function revokeCalibration(context: Context, raw: unknown) {
  return write(
    context,
    "revokeCalibration",
    revokeCalibrationInput,
    raw,
    async ({ transaction, input: { calibrationId, reason }, record }) => {
      const { reference, endedAs, endedAt } = await lockCalibration(transaction, calibrationId);
      if (endedAs && endedAs !== "replaced")
        throw refused(`Calibration ${reference} was already ${endedAs}.`);
      await endCalibration(transaction, context, calibrationId, {
        as: "revoked",
        reason,
        at: endedAt ?? undefined,
      });
      const certificates = (await certificatesResting(transaction, [calibrationId])).get(calibrationId) ?? [];
      await record({
        event: "calibration revoked",
        noun: "calibration",
        objectId: calibrationId,
        before: { reference, ended: endedAs },
        after: { certificates: certificates.map((certificate) => certificate.number) },
        reason,
      });
      return { calibrationId, certificates };
    },
  );
}
