import "server-only";
import { and, asc, eq, gt, isNull, lt, sql } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { brokenConstraint } from "../../db/lost-connection";
import { calibrations } from "../../db/schema/calibrations";
import { instruments } from "../../db/schema/instruments";
import { labDetails } from "../../db/schema/lab";
import { formatRecordDayOf } from "../../format/format-date";
import { notFound, refused } from "../access/errors";

export type Period = { validFrom: Date; validUntil: Date };

/** The instrument's row, locked: one calibration of it is recorded at a time. */
export async function lockInstrument(transaction: Transaction, instrumentId: string) {
  const [found] = await transaction
    .select({ instrumentId: instruments.id, code: instruments.code })
    .from(instruments)
    .where(eq(instruments.id, instrumentId))
    .for("update");
  if (!found) throw notFound("instrument");
  return found;
}

/** The calibration's row, locked until the transaction ends. */
export async function lockCalibration(transaction: Transaction, calibrationId: string) {
  const [found] = await transaction
    .select()
    .from(calibrations)
    .where(eq(calibrations.id, calibrationId))
    .for("update");
  if (!found) throw notFound("calibration");
  return found;
}

type Days = { validFrom: string; validUntil: string };

/** Days in the lab's zone as a period that holds through the last of them, and the time of the record. */
export async function readPeriod(transaction: Transaction, { validFrom, validUntil }: Days) {
  const start = (day: string, plus: number) =>
    sql<Date>`((${day}::date + ${plus}::int)::timestamp at time zone ${labDetails.timeZone})`;
  const [read] = await transaction
    .select({
      validFrom: start(validFrom, 0).mapWith(calibrations.validFrom),
      validUntil: sql<Date>`${start(validUntil, 1)} - interval '1 millisecond'`.mapWith(
        calibrations.validUntil,
      ),
      now: sql<Date>`record_now()`.mapWith(calibrations.recordedAt),
      zone: labDetails.timeZone,
    })
    .from(labDetails);
  return read!;
}

/** The calibration that stands within this period, if there is one; the earliest of several. */
export async function findOverlap(transaction: Transaction, instrumentId: string, period: Period) {
  const [found] = await transaction
    .select()
    .from(calibrations)
    .where(
      and(
        eq(calibrations.instrumentId, instrumentId),
        isNull(calibrations.endedAt),
        lt(calibrations.validFrom, period.validUntil),
        gt(calibrations.validUntil, period.validFrom),
      ),
    )
    .orderBy(asc(calibrations.validFrom))
    .limit(1)
    .for("update");
  return found ?? null;
}

export function overlapRefusal(code: string, standing: Period & { reference: string }, zone: string) {
  const from = formatRecordDayOf(standing.validFrom, zone);
  const until = formatRecordDayOf(standing.validUntil, zone);
  return refused(
    `${code} already has a calibration in this period: ${standing.reference}, ${from} to ${until}.`,
    ["Choose a period that does not overlap, let the new calibration take over, or revoke the earlier one."],
  );
}

type NewCalibration = typeof calibrations.$inferInsert;

/** Two at once are told apart by the database: the second overlaps the first. */
export async function insertCalibration(transaction: Transaction, code: string, values: NewCalibration) {
  const [added] = await transaction
    .insert(calibrations)
    .values(values)
    .returning({ calibrationId: calibrations.id })
    .catch((error: unknown) => {
      if (brokenConstraint(error) === "calibrations_no_overlap")
        throw refused(`${code} already has a calibration in this period.`);
      throw error;
    });
  return added!.calibrationId;
}
