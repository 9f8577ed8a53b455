import "server-only";
import { sql } from "drizzle-orm";
import {
  check,
  index,
  integer,
  jsonb,
  pgTable,
  primaryKey,
  smallint,
  text,
  uniqueIndex,
  uuid,
} from "drizzle-orm/pg-core";
import { between, instant, key, longest, measured, oneOf, recordedAt, version } from "../columns";
import { collections, driverKinds, phases } from "../vocabulary";
import { benchChannels, benches } from "./benches";
import { blobs } from "./blobs";
import { calibrations } from "./calibrations";
import { fluids } from "./fluids";
import { setInjectors } from "./injectors";
import { instruments } from "./instruments";
import { people } from "./people";
import { sets } from "./sets";

/** One run of a set over the bench. Its figures stand in its revisions; the latest one counts. */
export const cycles = pgTable(
  "cycles",
  {
    id: key("cycle_id"),
    setId: uuid("set_id")
      .notNull()
      .references(() => sets.id),
    phase: text("phase", { enum: phases }).notNull(),
    /** A phase may be measured again, after a second cleaning say: the highest number counts. */
    number: smallint("number").notNull(),
    recordedAt: recordedAt("recorded_at"),
  },
  (table) => [
    uniqueIndex("cycles_in_order").on(table.setId, table.phase, table.number),
    oneOf("cycles_phase_known", table.phase, phases),
  ],
);

export const cycleRevisions = pgTable(
  "cycle_revisions",
  {
    id: key("cycle_revision_id"),
    cycleId: uuid("cycle_id")
      .notNull()
      .references(() => cycles.id),
    revision: smallint("revision").notNull(),
    /** Null in the first, required in every correction. */
    reason: text("reason"),
    benchId: uuid("bench_id")
      .notNull()
      .references(() => benches.id),
    fluidId: uuid("fluid_id")
      .notNull()
      .references(() => fluids.id),
    fluidTemperatureC: measured("fluid_temperature_c", 5, 2).notNull(),
    pressureKpa: measured("pressure_kpa", 7, 2).notNull(),
    driveVolts: measured("drive_volts", 5, 2).notNull(),
    driverKind: text("driver_kind", { enum: driverKinds }).notNull(),
    periodMs: measured("period_ms", 8, 3).notNull(),
    collects: text("collects", { enum: collections }).notNull(),
    /** Copied from the bench's record as it stood, since the budget rests on it. */
    repeatability: measured("repeatability", 9, 5).notNull(),
    note: text("note").notNull().default(""),
    /** Doubtful readings that were looked at and recorded as read: what was said of each. */
    acknowledged: jsonb("acknowledged").$type<{ key: string; sentence: string }[]>().notNull().default([]),
    recordedBy: uuid("recorded_by")
      .notNull()
      .references(() => people.id),
    recordedAt: recordedAt("recorded_at"),
  },
  (table) => [
    uniqueIndex("cycle_revisions_in_order").on(table.cycleId, table.revision),
    index("cycle_revisions_by_bench").on(table.benchId, table.recordedAt),
    check("cycle_revisions_reason", sql`${table.revision} = 1 or char_length(${table.reason}) > 0`),
    between("cycle_revisions_fluid_temperature", table.fluidTemperatureC, 0, 60),
    between("cycle_revisions_pressure", table.pressureKpa, 20, 2000),
    between("cycle_revisions_drive_volts", table.driveVolts, 1, 100),
    between("cycle_revisions_period", table.periodMs, 0.1, 10000),
    oneOf("cycle_revisions_driver_known", table.driverKind, driverKinds),
    oneOf("cycle_revisions_collects_known", table.collects, collections),
    longest("cycle_revisions_note_length", table.note, 2000),
  ],
);

/** Which injector sat in which channel, and the calibration of that channel's cylinder or balance then in force. */
export const cycleInjectors = pgTable(
  "cycle_injectors",
  {
    revisionId: uuid("cycle_revision_id")
      .notNull()
      .references(() => cycleRevisions.id),
    setInjectorId: uuid("set_injector_id")
      .notNull()
      .references(() => setInjectors.id),
    channelId: uuid("bench_channel_id")
      .notNull()
      .references(() => benchChannels.id),
    /** A set larger than the bench is measured in several loads. */
    load: smallint("load").notNull(),
    instrumentId: uuid("instrument_id")
      .notNull()
      .references(() => instruments.id),
    calibrationId: uuid("calibration_id")
      .notNull()
      .references(() => calibrations.id),
  },
  (table) => [
    primaryKey({ columns: [table.revisionId, table.setInjectorId] }),
    uniqueIndex("cycle_injectors_one_per_channel").on(table.revisionId, table.load, table.channelId),
    index("cycle_injectors_by_calibration").on(table.calibrationId),
    index("cycle_injectors_by_injector").on(table.setInjectorId),
    between("cycle_injectors_load", table.load, 1, 48),
  ],
);

/** The bench's gauge, thermometer, meter, timer and supply with their calibrations then in force. */
export const cycleInstruments = pgTable(
  "cycle_instruments",
  {
    revisionId: uuid("cycle_revision_id")
      .notNull()
      .references(() => cycleRevisions.id),
    instrumentId: uuid("instrument_id")
      .notNull()
      .references(() => instruments.id),
    calibrationId: uuid("calibration_id")
      .notNull()
      .references(() => calibrations.id),
  },
  (table) => [
    primaryKey({ columns: [table.revisionId, table.instrumentId] }),
    index("cycle_instruments_by_calibration").on(table.calibrationId),
  ],
);

/** What is being typed on the bench page, value by value as typed, until it is recorded. */
export const cycleDrafts = pgTable(
  "cycle_drafts",
  {
    id: key("cycle_draft_id"),
    setId: uuid("set_id")
      .notNull()
      .references(() => sets.id),
    phase: text("phase", { enum: phases }).notNull(),
    /** The cycle that this draft corrects. */
    correctsCycleId: uuid("corrects_cycle_id").references(() => cycles.id),
    fields: jsonb("fields").$type<Record<string, string>>().notNull().default({}),
    version: version(),
    openedBy: uuid("opened_by")
      .notNull()
      .references(() => people.id),
    openedAt: recordedAt("opened_at"),
    savedBy: uuid("saved_by")
      .notNull()
      .references(() => people.id),
    savedAt: recordedAt("saved_at"),
    /** Closed by recording or by being put away with a reason. */
    closedAt: instant("closed_at"),
    recordedRevisionId: uuid("recorded_revision_id").references(() => cycleRevisions.id),
    putAwayReason: text("put_away_reason"),
  },
  (table) => [
    uniqueIndex("cycle_drafts_one_open").on(table.setId, table.phase).where(sql`${table.closedAt} is null`),
    oneOf("cycle_drafts_phase_known", table.phase, phases),
  ],
);

/** Readings that came as a file: the bytes as they were sent. */
export const readingFiles = pgTable(
  "reading_files",
  {
    id: key("reading_file_id"),
    draftId: uuid("cycle_draft_id")
      .notNull()
      .references(() => cycleDrafts.id),
    sha256: text("sha256")
      .notNull()
      .references(() => blobs.sha256),
    name: text("name").notNull(),
    rows: integer("rows").notNull(),
    sentBy: uuid("sent_by")
      .notNull()
      .references(() => people.id),
    sentAt: recordedAt("sent_at"),
  },
  (table) => [
    index("reading_files_by_draft").on(table.draftId),
    longest("reading_files_name_length", table.name, 200),
  ],
);
