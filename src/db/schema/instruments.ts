import "server-only";
import { sql } from "drizzle-orm";
import { index, integer, pgTable, text, uniqueIndex } from "drizzle-orm/pg-core";
import { between, instant, key, longest, measured, oneOf, recordedAt, version } from "../columns";
import { instrumentKinds } from "../vocabulary";

export const instruments = pgTable(
  "instruments",
  {
    id: key("instrument_id"),
    /** As it is engraved or labelled in the lab: CY-04. */
    code: text("code").notNull(),
    kind: text("kind", { enum: instrumentKinds }).notNull(),
    maker: text("maker").notNull().default(""),
    serial: text("serial").notNull().default(""),
    /** mL, g, kPa, °C, Ω, ms or V, by its kind. */
    rangeHigh: measured("range_high", 12, 4).notNull(),
    division: measured("division", 12, 6).notNull(),
    intervalMonths: integer("interval_months").notNull().default(12),
    retiredAt: instant("retired_at"),
    version: version(),
    createdAt: recordedAt("created_at"),
  },
  (table) => [
    uniqueIndex("instruments_one_per_code").on(sql`lower(${table.code})`),
    index("instruments_by_kind").on(table.kind),
    longest("instruments_code_length", table.code, 30),
    oneOf("instruments_kind_known", table.kind, instrumentKinds),
    between("instruments_range_high", table.rangeHigh, 0.0001, 99999),
    between("instruments_division", table.division, 0.000001, 1000),
    between("instruments_interval", table.intervalMonths, 1, 120),
  ],
);
