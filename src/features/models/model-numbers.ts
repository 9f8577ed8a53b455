import { type ModelValues, modelLabels } from "@/data/models/inputs";

const units: Partial<Record<keyof ModelValues, string>> = {
  resistanceLowOhm: "Ω",
  resistanceHighOhm: "Ω",
  ratedFlowMlPerMin: "mL/min",
  ratedFlowBandPercent: "%",
  ratedPressureKpa: "kPa",
  leakageLimitMm3PerMin: "mm³/min",
  leakagePressureKpa: "kPa",
};

/** The figures of a model with the unit beside the field instead of in its label. */
export const modelNumbers = Object.entries(units).map(([key, unit]) => ({
  key,
  unit,
  label: modelLabels[key as keyof ModelValues].split(",")[0]!,
}));
