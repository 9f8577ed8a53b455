import "server-only";
import { sql } from "drizzle-orm";
import { type AnyPgColumn, check, index, pgTable, text, uuid } from "drizzle-orm/pg-core";
import { between, instant, key, longest, measured, oneOf, recordedAt } from "../columns";
import { calibrationEnds } from "../vocabulary";
import { instruments } from "./instruments";
import { people } from "./people";

/**
 * What an instrument's calibration found: true = gain · indicated + offset, each with its standard uncertainty.
 * Validity periods of one instrument cannot overlap: an exclusion constraint in the migrations holds it.
 */
export const calibrations = pgTable(
  "calibrations",
  {
    id: key("calibration_id"),
    instrumentId: uuid("instrument_id")
      .notNull()
      .references(() => instruments.id),
    /** The number on the calibration's own sheet. */
    reference: text("reference").notNull(),
    validFrom: instant("valid_from").notNull(),
    validUntil: instant("valid_until").notNull(),
    gain: measured("gain", 12, 9).notNull(),
    offset: measured("offset_value", 14, 8).notNull(),
    gainU: measured("gain_u", 12, 9).notNull(),
    offsetU: measured("offset_u", 14, 8).notNull(),
    note: text("note").notNull().default(""),
    recordedBy: uuid("recorded_by")
      .notNull()
      .references(() => people.id),
    recordedAt: recordedAt("recorded_at"),
    correctsId: uuid("corrects_id").references((): AnyPgColumn => calibrations.id),
    correctionReason: text("correction_reason"),
    /** Out of force before its day: what it was replaced by starts then, or it should not be relied upon. */
    endedAs: text("ended_as", { enum: calibrationEnds }),
    endedAt: instant("ended_at"),
    endedBy: uuid("ended_by").references(() => people.id),
    endedReason: text("ended_reason"),
  },
  (table) => [
    index("calibrations_by_instrument").on(table.instrumentId, table.validUntil),
    check("calibrations_period", sql`${table.validFrom} < ${table.validUntil}`),
    check("calibrations_end", sql`(${table.endedAt} is null) = (${table.endedAs} is null)`),
    oneOf("calibrations_end_known", table.endedAs, calibrationEnds),
    between("calibrations_gain", table.gain, 0.5, 2),
    between("calibrations_offset", table.offset, -10000, 10000),
    between("calibrations_gain_u", table.gainU, 0, 0.5),
    between("calibrations_offset_u", table.offsetU, 0, 10000),
    longest("calibrations_reference_length", table.reference, 80),
  ],
);
