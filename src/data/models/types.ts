import type { impedanceBands, sprayTypes } from "../../db/vocabulary";

export type Model = {
  modelId: string;
  make: string;
  partNumber: string;
  impedanceBand: (typeof impedanceBands)[number];
  resistanceLowOhm: number;
  resistanceHighOhm: number;
  ratedFlowMlPerMin: number;
  ratedFlowBandPercent: number;
  ratedPressureKpa: number;
  leakageLimitMm3PerMin: number;
  leakagePressureKpa: number;
  sprayType: (typeof sprayTypes)[number];
  /** False while the manager has not looked at a model entered at the counter. */
  confirmed: boolean;
};

/** One line of a file of models, as it would be taken over. */
export type ModelImportLine = { line: number; make: string; partNumber: string; change: "new" | "known" };
export type ModelImportProblem = { line: number; column: string | null; message: string };
export type ModelImportPreview = { lines: ModelImportLine[]; problems: ModelImportProblem[] };
