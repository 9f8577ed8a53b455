import "server-only";
import { sql } from "drizzle-orm";
import {
  bigint,
  check,
  index,
  integer,
  pgTable,
  primaryKey,
  smallint,
  text,
  uniqueIndex,
  uuid,
} from "drizzle-orm/pg-core";
import { between, longest, measured, oneOf } from "../columns";
import { sprayGrades } from "../vocabulary";
import { cycleRevisions } from "./cycles";
import { setInjectors } from "./injectors";

/** What was read, never what was derived from it. */
export const readings = pgTable(
  "readings",
  {
    id: bigint("reading_id", { mode: "number" }).primaryKey().generatedAlwaysAsIdentity(),
    revisionId: uuid("cycle_revision_id")
      .notNull()
      .references(() => cycleRevisions.id),
    setInjectorId: uuid("set_injector_id")
      .notNull()
      .references(() => setInjectors.id),
    /** Null when the injector was held open. */
    pulseWidthMs: measured("pulse_width_ms", 8, 4),
    pulseCount: integer("pulse_count"),
    openSeconds: measured("open_seconds", 8, 3),
    repeat: smallint("repeat").notNull(),
    /** mL in the cylinder or g on the balance, as indicated. */
    amount: measured("amount", 10, 4).notNull(),
  },
  (table) => [
    uniqueIndex("readings_once").on(
      table.revisionId,
      table.setInjectorId,
      sql`coalesce(${table.pulseWidthMs}, 0)`,
      table.repeat,
    ),
    index("readings_by_injector").on(table.setInjectorId),
    check(
      "readings_pulsed_or_held_open",
      sql`(${table.pulseWidthMs} is null) = (${table.pulseCount} is null) and (${table.pulseWidthMs} is null) <> (${table.openSeconds} is null)`,
    ),
    between("readings_pulse_width", table.pulseWidthMs, 0.05, 1000),
    between("readings_pulse_count", table.pulseCount, 1, 1000000),
    between("readings_open_seconds", table.openSeconds, 0.1, 3600),
    between("readings_repeat", table.repeat, 1, 20),
    between("readings_amount", table.amount, 0, 100000),
  ],
);

/** Winding, insulation, leakage and spray of one injector in one cycle; what was not checked is null. */
export const injectorChecks = pgTable(
  "injector_checks",
  {
    revisionId: uuid("cycle_revision_id")
      .notNull()
      .references(() => cycleRevisions.id),
    setInjectorId: uuid("set_injector_id")
      .notNull()
      .references(() => setInjectors.id),
    windingOhm: measured("winding_ohm", 8, 3),
    leadOhm: measured("lead_ohm", 6, 3),
    windingTemperatureC: measured("winding_temperature_c", 5, 2),
    insulationMegohm: measured("insulation_megohm", 9, 2),
    leakageMm3PerMin: measured("leakage_mm3_per_min", 8, 2),
    leakagePressureKpa: measured("leakage_pressure_kpa", 7, 2),
    leakageSeconds: measured("leakage_seconds", 7, 1),
    sprayGrade: text("spray_grade", { enum: sprayGrades }),
    note: text("note").notNull().default(""),
  },
  (table) => [
    primaryKey({ columns: [table.revisionId, table.setInjectorId] }),
    check(
      "injector_checks_winding_with_temperature",
      sql`(${table.windingOhm} is null) = (${table.windingTemperatureC} is null)`,
    ),
    check(
      "injector_checks_leakage_with_conditions",
      sql`${table.leakageMm3PerMin} is null or (${table.leakagePressureKpa} is not null and ${table.leakageSeconds} is not null)`,
    ),
    between("injector_checks_winding", table.windingOhm, 0.05, 1000),
    between("injector_checks_lead", table.leadOhm, 0, 20),
    between("injector_checks_winding_temperature", table.windingTemperatureC, -10, 120),
    between("injector_checks_insulation", table.insulationMegohm, 0, 1000000),
    between("injector_checks_leakage", table.leakageMm3PerMin, 0, 100000),
    between("injector_checks_leakage_pressure", table.leakagePressureKpa, 20, 2000),
    between("injector_checks_leakage_seconds", table.leakageSeconds, 1, 3600),
    oneOf("injector_checks_spray_known", table.sprayGrade, sprayGrades),
    longest("injector_checks_note_length", table.note, 500),
  ],
);
