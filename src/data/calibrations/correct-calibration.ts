import "server-only";
import { dayOf, isoDay } from "../../format/calendar";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { invalid, refused } from "../access/errors";
import { changedFields } from "../audit/changed-fields";
import { write } from "../write";
import { endCalibration } from "./end-calibration";
import { correctCalibrationInput } from "./inputs";
import {
  findOverlap,
  insertCalibration,
  lockCalibration,
  lockInstrument,
  overlapRefusal,
  readPeriod,
} from "./internal";

/** A new entry in place of one that was entered wrongly; the wrong one stays on record, ended with the reason. */
export function correctCalibration(context: Context, raw: unknown) {
  return write(
    context,
    "correctCalibration",
    correctCalibrationInput,
    raw,
    async ({ transaction, input, record }) => {
      const { idempotencyKey: _key, calibrationId, reason, validUntil: untilDay, ...values } = input;
      const wrong = await lockCalibration(transaction, calibrationId);
      if (wrong.endedAs) throw refused(`Calibration ${wrong.reference} was already ${wrong.endedAs}.`);
      const { code } = await lockInstrument(transaction, wrong.instrumentId);
      await endCalibration(transaction, context, calibrationId, { as: "corrected", reason });
      const { zone, ...read } = await readPeriod(transaction, { validFrom: untilDay, validUntil: untilDay });
      const sameDay = isoDay(dayOf(wrong.validUntil, zone)) === untilDay;
      const period = {
        validFrom: wrong.validFrom,
        validUntil: sameDay ? wrong.validUntil : read.validUntil,
      };
      if (period.validUntil <= period.validFrom)
        throw invalid("validUntil", "Valid until is not before valid from.");
      const standing = await findOverlap(transaction, wrong.instrumentId, period);
      if (standing) throw overlapRefusal(code, standing, zone);
      const correctionId = await insertCalibration(transaction, code, {
        ...values,
        ...period,
        instrumentId: wrong.instrumentId,
        correctsId: calibrationId,
        correctionReason: reason,
        recordedBy: requirePerson(context).personId,
      });
      await record({
        event: "calibration corrected",
        noun: "calibration",
        objectId: correctionId,
        ...changedFields(
          { ...wrong, validUntil: isoDay(dayOf(wrong.validUntil, zone)) },
          { ...values, validUntil: untilDay },
        ),
        reason,
      });
      return { calibrationId: correctionId };
    },
  );
}
