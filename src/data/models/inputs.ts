import { z } from "zod";
import { impedanceBands, sprayTypes } from "../../db/vocabulary";
import { baseVersion, choice, decimal, id, page, searched, text, writeInput } from "../fields";

/** An injector model's own data; part of check-in too, where a new model is entered in the same form. */
export const modelFields = {
  make: text({ label: "Make", longest: 80 }),
  partNumber: text({ label: "Part number", longest: 80 }),
  impedanceBand: choice("Impedance band", impedanceBands),
  resistanceLowOhm: decimal({ label: "Lowest resistance", low: 0.1, high: 200, decimals: 3, unit: "Ω" }),
  resistanceHighOhm: decimal({ label: "Highest resistance", low: 0.1, high: 200, decimals: 3, unit: "Ω" }),
  ratedFlowMlPerMin: decimal({ label: "Rated flow", low: 10, high: 10_000, decimals: 2, unit: "mL/min" }),
  ratedFlowBandPercent: decimal({ label: "Rated flow band", low: 0.5, high: 50, decimals: 2, unit: "%" }),
  ratedPressureKpa: decimal({ label: "Rated pressure", low: 50, high: 2000, decimals: 2, unit: "kPa" }),
  leakageLimitMm3PerMin: decimal({
    label: "Leakage limit",
    low: 0,
    high: 1000,
    decimals: 2,
    unit: "mm³/min",
  }),
  leakagePressureKpa: decimal({ label: "Leakage pressure", low: 50, high: 2000, decimals: 2, unit: "kPa" }),
  sprayType: choice("Spray type", sprayTypes),
};

type Resistances = { resistanceLowOhm: number; resistanceHighOhm: number };

/** For the refinement of every object that holds `modelFields`. */
export function resistancesInOrder({ resistanceLowOhm, resistanceHighOhm }: Resistances): boolean {
  return !(resistanceLowOhm > resistanceHighOhm);
}
export const resistancesOutOfOrder = {
  path: ["resistanceHighOhm"],
  message: "Highest resistance is not below the lowest.",
};

export const modelValues = z.object(modelFields).refine(resistancesInOrder, resistancesOutOfOrder);
export type ModelValues = z.output<typeof modelValues>;

/** How a model's fields are called, on forms, in conflicts and as columns of a file. */
export const modelLabels: Record<keyof ModelValues, string> = {
  make: "Make",
  partNumber: "Part number",
  impedanceBand: "Impedance band",
  resistanceLowOhm: "Lowest resistance, Ω",
  resistanceHighOhm: "Highest resistance, Ω",
  ratedFlowMlPerMin: "Rated flow, mL/min",
  ratedFlowBandPercent: "Rated flow band, ± %",
  ratedPressureKpa: "Rated pressure, kPa",
  leakageLimitMm3PerMin: "Leakage limit, mm³/min",
  leakagePressureKpa: "Leakage pressure, kPa",
  sprayType: "Spray type",
};

/** The header of each column in a file of models. */
export const modelColumnNames: Record<keyof ModelValues, string> = {
  make: "make",
  partNumber: "part_number",
  impedanceBand: "impedance_band",
  resistanceLowOhm: "resistance_low_ohm",
  resistanceHighOhm: "resistance_high_ohm",
  ratedFlowMlPerMin: "rated_flow_ml_per_min",
  ratedFlowBandPercent: "rated_flow_band_percent",
  ratedPressureKpa: "rated_pressure_kpa",
  leakageLimitMm3PerMin: "leakage_limit_mm3_per_min",
  leakagePressureKpa: "leakage_pressure_kpa",
  sprayType: "spray_type",
};

export const addModelInput = writeInput(modelFields).refine(resistancesInOrder, resistancesOutOfOrder);
export const editModelInput = writeInput({
  modelId: id("model"),
  version: baseVersion,
  ...modelFields,
}).refine(resistancesInOrder, resistancesOutOfOrder);

export const getModelInput = z.object({ modelId: id("model") });
export const findModelsInput = z.object({ search: searched() });
export const listModelsInput = page.extend({
  search: searched(),
  /** Only those entered at the counter that nobody has looked at yet. */
  unconfirmed: z.coerce.boolean().catch(false),
});

const csv = z
  .string({ error: "Please choose a CSV file." })
  .min(1, "The file is empty.")
  .max(900_000, "The file has at most 900 000 characters.");
export const previewModelsInput = z.object({ csv });
export const importModelsInput = writeInput({ csv });
