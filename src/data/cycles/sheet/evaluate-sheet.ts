import type { CycleFigures, FlowReference } from "../../../metrology/cycle/types";
import { evaluateRun } from "./evaluate-run";
import { runOfSheet, type SheetFluid } from "./run-of-sheet";
import type { CycleBench, Sheet } from "./types";

type Beside = {
  bench: CycleBench;
  fluids: SheetFluid[];
  reference: FlowReference;
  model: { ratedFlowMlPerMin: number; ratedFlowBandPercent: number; ratedPressureKpa: number };
  earlier: CycleFigures | null;
  draws?: number;
};

/** Figures and doubtful readings of a sheet as far as it is typed. */
export function evaluateSheet(sheet: Sheet, { bench, fluids, reference, ...judging }: Beside) {
  const tags = new Map(sheet.rows.map((row) => [row.setInjectorId, row.tag]));
  const run = runOfSheet(sheet, { bench, fluids, reference });
  return evaluateRun(run, { ...judging, reference, tagOf: (id) => tags.get(id) ?? "An injector" });
}
