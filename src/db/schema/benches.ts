import "server-only";
import { sql } from "drizzle-orm";
import { index, pgTable, smallint, text, uniqueIndex, uuid } from "drizzle-orm/pg-core";
import { between, instant, key, longest, measured, oneOf, recordedAt, version } from "../columns";
import { collections, driverKinds } from "../vocabulary";
import { fluids } from "./fluids";
import { instruments } from "./instruments";
import { people } from "./people";

export const benches = pgTable(
  "benches",
  {
    id: key("bench_id"),
    code: text("code").notNull(),
    location: text("location").notNull().default(""),
    collects: text("collects", { enum: collections }).notNull(),
    /** Standard uncertainty of one collected amount from repeatability alone: mL or g. */
    repeatability: measured("repeatability", 9, 5).notNull(),
    /** What a new cycle on this bench starts from. */
    fluidId: uuid("fluid_id")
      .notNull()
      .references(() => fluids.id),
    driveVolts: measured("drive_volts", 5, 2).notNull(),
    driverKind: text("driver_kind", { enum: driverKinds }).notNull(),
    periodMs: measured("period_ms", 8, 3).notNull(),
    retiredAt: instant("retired_at"),
    version: version(),
    createdAt: recordedAt("created_at"),
  },
  (table) => [
    uniqueIndex("benches_one_per_code").on(sql`lower(${table.code})`),
    longest("benches_code_length", table.code, 20),
    oneOf("benches_collects_known", table.collects, collections),
    between("benches_repeatability", table.repeatability, 0, 100),
    between("benches_drive_volts", table.driveVolts, 1, 100),
    between("benches_period", table.periodMs, 0.1, 10000),
  ],
);

export const benchChannels = pgTable(
  "bench_channels",
  {
    id: key("bench_channel_id"),
    benchId: uuid("bench_id")
      .notNull()
      .references(() => benches.id),
    number: smallint("number").notNull(),
  },
  (table) => [
    uniqueIndex("bench_channels_once").on(table.benchId, table.number),
    between("bench_channels_number", table.number, 1, 24),
  ],
);

/** Which instrument a bench used, and since when. A cylinder or balance belongs to a channel, the rest to the bench. */
export const benchInstruments = pgTable(
  "bench_instruments",
  {
    id: key("bench_instrument_id"),
    benchId: uuid("bench_id")
      .notNull()
      .references(() => benches.id),
    channelId: uuid("bench_channel_id").references(() => benchChannels.id),
    instrumentId: uuid("instrument_id")
      .notNull()
      .references(() => instruments.id),
    sinceAt: recordedAt("since_at"),
    untilAt: instant("until_at"),
  },
  (table) => [
    index("bench_instruments_by_bench").on(table.benchId),
    uniqueIndex("bench_instruments_one_place").on(table.instrumentId).where(sql`${table.untilAt} is null`),
    uniqueIndex("bench_instruments_one_per_channel")
      .on(table.channelId)
      .where(sql`${table.untilAt} is null and ${table.channelId} is not null`),
  ],
);

export const benchHolds = pgTable(
  "bench_holds",
  {
    id: key("bench_hold_id"),
    benchId: uuid("bench_id")
      .notNull()
      .references(() => benches.id),
    reason: text("reason").notNull(),
    heldBy: uuid("held_by")
      .notNull()
      .references(() => people.id),
    heldAt: recordedAt("held_at"),
    clearedBy: uuid("cleared_by").references(() => people.id),
    clearedAt: instant("cleared_at"),
    clearedReason: text("cleared_reason"),
  },
  (table) => [
    uniqueIndex("bench_holds_one_open").on(table.benchId).where(sql`${table.clearedAt} is null`),
    index("bench_holds_by_bench").on(table.benchId, table.heldAt),
  ],
);
