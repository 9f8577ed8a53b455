import "server-only";
import { sql } from "drizzle-orm";
import { check, index, pgTable, text, uniqueIndex } from "drizzle-orm/pg-core";
import { between, instant, key, longest, measured, oneOf, recordedAt, version } from "../columns";
import { impedanceBands, sprayTypes } from "../vocabulary";

export const injectorModels = pgTable(
  "injector_models",
  {
    id: key("injector_model_id"),
    make: text("make").notNull(),
    partNumber: text("part_number").notNull(),
    impedanceBand: text("impedance_band", { enum: impedanceBands }).notNull(),
    resistanceLowOhm: measured("resistance_low_ohm", 8, 3).notNull(),
    resistanceHighOhm: measured("resistance_high_ohm", 8, 3).notNull(),
    ratedFlowMlPerMin: measured("rated_flow_ml_per_min", 9, 2).notNull(),
    /** How far from the rated flow a sound injector of this model may be, either way. */
    ratedFlowBandPercent: measured("rated_flow_band_percent", 5, 2).notNull(),
    ratedPressureKpa: measured("rated_pressure_kpa", 8, 2).notNull(),
    leakageLimitMm3PerMin: measured("leakage_limit_mm3_per_min", 8, 2).notNull(),
    leakagePressureKpa: measured("leakage_pressure_kpa", 8, 2).notNull(),
    sprayType: text("spray_type", { enum: sprayTypes }).notNull(),
    /** Null for a model entered at the counter until the manager has looked at it. */
    confirmedAt: instant("confirmed_at"),
    version: version(),
    createdAt: recordedAt("created_at"),
  },
  (table) => [
    uniqueIndex("injector_models_one_per_part_number").on(
      sql`lower(${table.make})`,
      sql`lower(${table.partNumber})`,
    ),
    index("injector_models_by_name_parts").using(
      "gin",
      sql`lower(${table.make} || ' ' || ${table.partNumber}) gin_trgm_ops`,
    ),
    longest("injector_models_make_length", table.make, 80),
    longest("injector_models_part_number_length", table.partNumber, 80),
    oneOf("injector_models_impedance_known", table.impedanceBand, impedanceBands),
    oneOf("injector_models_spray_known", table.sprayType, sprayTypes),
    between("injector_models_resistance_low", table.resistanceLowOhm, 0.1, 200),
    between("injector_models_resistance_high", table.resistanceHighOhm, 0.1, 200),
    check("injector_models_resistance_order", sql`${table.resistanceLowOhm} <= ${table.resistanceHighOhm}`),
    between("injector_models_rated_flow", table.ratedFlowMlPerMin, 10, 10000),
    between("injector_models_rated_flow_band", table.ratedFlowBandPercent, 0.5, 50),
    between("injector_models_rated_pressure", table.ratedPressureKpa, 50, 2000),
    between("injector_models_leakage_limit", table.leakageLimitMm3PerMin, 0, 1000),
    between("injector_models_leakage_pressure", table.leakagePressureKpa, 50, 2000),
  ],
);
