import type {
  CertifiedChecks,
  CertifiedInjector,
  CertifiedPhase,
  PresentedResults,
} from "@/data/certificates";
import { niceCeiling } from "@/format/picture/nice-ticks";
import type { InjectorFigures } from "@/metrology/cycle/types";

/** One injector in one phase. */
export type PhaseResult = {
  figures: InjectorFigures;
  checks: CertifiedChecks | null;
  deviationPercent: number | null;
};
export type ResultRow = { injector: CertifiedInjector; found: PhaseResult | null; left: PhaseResult | null };

/** Every injector of the visit with its figures as found and as left, by place. */
export function resultRows({ injectors, asFound, asLeft }: PresentedResults): ResultRow[] {
  const found = byInjector(asFound);
  const left = byInjector(asLeft);
  return injectors.map((injector) => ({
    injector,
    found: found.get(injector.injectorId) ?? null,
    left: left.get(injector.injectorId) ?? null,
  }));
}

function byInjector(phase: CertifiedPhase | null): Map<string, PhaseResult> {
  if (!phase) return new Map();
  const checks = new Map(phase.checks.map((check) => [check.injectorId, check]));
  const deviations = staticDeviations(phase);
  return new Map(
    phase.figures.injectors.map((figures) => [
      figures.injectorId,
      {
        figures,
        checks: checks.get(figures.injectorId) ?? null,
        deviationPercent: deviations.get(figures.injectorId) ?? null,
      },
    ]),
  );
}

/** Deviations of the static flows from the set's mean: those of the spread, under their injectors. */
function staticDeviations({ figures }: CertifiedPhase): Map<string, number> {
  const withFlow = figures.injectors.filter((injector) => injector.staticFlow !== null);
  const deviations = figures.staticSpread?.deviationsPercent ?? [];
  return new Map(
    withFlow.flatMap(({ injectorId }, index) => {
      const deviation = deviations[index];
      return deviation === undefined ? [] : [[injectorId, deviation] as const];
    }),
  );
}

/** Pulse widths of both phases, as they were set. */
export function widthsOf({ asFound, asLeft }: PresentedResults): number[] {
  const widths = [asFound, asLeft].flatMap((phase) => phase?.widths.map((width) => width.pulseWidthMs) ?? []);
  return [...new Set(widths)].sort((one, other) => one - other);
}

export function flowAt(result: PhaseResult | null, pulseWidthMs: number): number | null {
  return result?.figures.flows.find((flow) => flow.pulseWidthMs === pulseWidthMs)?.volumePerPulseUl ?? null;
}

export type DeadTime = { value: number; low: number; high: number; standardError: number | null };

/** A dead time whose interval cannot be had is not determined: nothing is shown for it. */
export function deadTimeOf(result: PhaseResult | null): DeadTime | null {
  const line = result?.figures.flowLine;
  if (!line?.deadTimeInterval) return null;
  return { value: line.deadTimeMs, ...line.deadTimeInterval, standardError: line.deadTimeSeMs };
}

/** Half of the spread that the class allows the static flow: what one injector may be off the mean, either way. */
export function halfLimitOf({ toleranceClass }: PresentedResults): number | null {
  const limit = toleranceClass.staticSpreadPercent;
  return limit === null ? null : limit / 2;
}

/** A deviation scale that all rows share: the largest as left, and not below the limit. */
export function deviationScale(results: PresentedResults): number {
  const deviations = resultRows(results).map(({ found, left }) => (left ?? found)?.deviationPercent ?? 0);
  return niceCeiling(Math.max(0.5, halfLimitOf(results) ?? 0, ...deviations.map(Math.abs)));
}
