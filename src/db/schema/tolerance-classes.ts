import "server-only";
import { sql } from "drizzle-orm";
import { integer, pgTable, primaryKey, text, uniqueIndex, uuid } from "drizzle-orm/pg-core";
import { between, instant, key, longest, measured, recordedAt, version } from "../columns";
import { people } from "./people";

export const toleranceClasses = pgTable(
  "tolerance_classes",
  {
    id: key("tolerance_class_id"),
    name: text("name").notNull(),
    retiredAt: instant("retired_at"),
    version: version(),
    createdAt: recordedAt("created_at"),
  },
  (table) => [
    uniqueIndex("tolerance_classes_one_per_name").on(sql`lower(${table.name})`),
    longest("tolerance_classes_name_length", table.name, 80),
  ],
);

/** What the class asks, as it stood: a certificate names the revision that it was judged by. */
export const toleranceClassRevisions = pgTable(
  "tolerance_class_revisions",
  {
    id: key("tolerance_class_revision_id"),
    toleranceClassId: uuid("tolerance_class_id")
      .notNull()
      .references(() => toleranceClasses.id),
    revision: integer("revision").notNull(),
    /** Spread is 100·(max − min)/mean. A limit that is null is not judged. */
    staticSpreadPercent: measured("static_spread_percent", 6, 3),
    deadTimeRangeMs: measured("dead_time_range_ms", 7, 4),
    resistanceRangeOhm: measured("resistance_range_ohm", 7, 3),
    /** Tighter than the model's own limit where the class asks for it. */
    leakageLimitMm3PerMin: measured("leakage_limit_mm3_per_min", 8, 2),
    recordedBy: uuid("recorded_by")
      .notNull()
      .references(() => people.id),
    recordedAt: recordedAt("recorded_at"),
  },
  (table) => [
    uniqueIndex("tolerance_class_revisions_in_order").on(table.toleranceClassId, table.revision),
    between("tolerance_class_static_spread", table.staticSpreadPercent, 0.01, 100),
    between("tolerance_class_dead_time_range", table.deadTimeRangeMs, 0.0001, 10),
    between("tolerance_class_resistance_range", table.resistanceRangeOhm, 0.001, 100),
    between("tolerance_class_leakage", table.leakageLimitMm3PerMin, 0, 1000),
  ],
);

/** A limit holds from its pulse width up to the next one's. */
export const toleranceClassLimits = pgTable(
  "tolerance_class_limits",
  {
    revisionId: uuid("tolerance_class_revision_id")
      .notNull()
      .references(() => toleranceClassRevisions.id),
    fromPulseWidthMs: measured("from_pulse_width_ms", 8, 4).notNull(),
    spreadPercent: measured("spread_percent", 6, 3).notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.revisionId, table.fromPulseWidthMs] }),
    between("tolerance_class_limits_width", table.fromPulseWidthMs, 0, 1000),
    between("tolerance_class_limits_spread", table.spreadPercent, 0.01, 100),
  ],
);
