import { checkReadings } from "../../../metrology/cycle/check-readings";
import { evaluateCycle } from "../../../metrology/cycle/evaluate-cycle";
import type { CycleFigures, FlowReference } from "../../../metrology/cycle/types";
import { describeDoubt } from "./describe-doubt";
import { type NewFinding, plainFindings } from "./findings-of-run";
import { cycleInputOf, type Run, trueWidth } from "./run";

type Judging = {
  reference: FlowReference;
  model: { ratedFlowMlPerMin: number; ratedFlowBandPercent: number; ratedPressureKpa: number };
  tagOf: (setInjectorId: string) => string;
  /** Figures of an earlier cycle of the same set. */
  earlier: CycleFigures | null;
  /** Draws of the Monte Carlo intervals; fewer while typing. */
  draws?: number;
};

/** Figures and doubtful readings of a run, the same while it is typed, when it is recorded and ever after. */
export function evaluateRun(run: Run, judging: Judging): { figures: CycleFigures; findings: NewFinding[] } {
  const { reference, model, tagOf, earlier, draws } = judging;
  const input = cycleInputOf(run, reference);
  const figures = evaluateCycle(input, draws === undefined ? {} : { draws });
  const asSet = widthsAsSet(run);
  const doubts = checkReadings(input, figures, {
    model,
    ...(earlier ? { earlier } : {}),
  });
  const findings = doubts.map((doubt) => describeDoubt(doubt, { asSet, tagOf }));
  return { figures: nameAsSet(figures, asSet), findings: [...plainFindings(run, tagOf), ...findings] };
}

/** The width that was set, by the true one that the timer's calibration makes of it. */
function widthsAsSet(run: Run): Map<number, number> {
  const widths = run.injectors.flatMap(({ readings }) => readings.map((reading) => reading.pulseWidthMs));
  return new Map(
    [...new Set(widths)].flatMap((width) => (width === null ? [] : [[trueWidth(run, width), width]])),
  );
}

/** Columns keep the names of the widths that were set, so that as found and as left stand above each other. */
function nameAsSet(figures: CycleFigures, asSet: Map<number, number>): CycleFigures {
  const renamed = <Entry extends { pulseWidthMs: number }>(entry: Entry): Entry => ({
    ...entry,
    pulseWidthMs: asSet.get(entry.pulseWidthMs) ?? entry.pulseWidthMs,
  });
  return {
    ...figures,
    widths: figures.widths.map(renamed),
    injectors: figures.injectors.map((injector) => ({ ...injector, flows: injector.flows.map(renamed) })),
  };
}
