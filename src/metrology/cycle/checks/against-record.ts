import type { CheckAgainst, ClosureOver5, DutyOver100, OutsideTheBand } from "../doubt";
import type { CycleFigures, CycleInput } from "../types";
import { thresholds } from "./thresholds";

/** Pulse widths that are not shorter than the period. */
export function findDutyOver100(figures: CycleFigures, { conditions }: CycleInput): DutyOver100[] {
  return figures.injectors.flatMap(({ injectorId, flows }) =>
    flows
      .filter(({ dutyPercent }) => dutyPercent >= 100)
      .map(({ pulseWidthMs, dutyPercent }) => ({
        kind: "duty over 100 %",
        injectorId,
        pulseWidthMs,
        periodMs: conditions.periodMs,
        dutyPercent,
      })),
  );
}

/** Static flow of the line, or held open without one, further from the model's rated flow than its band. */
export function findOutsideTheBand(
  figures: CycleFigures,
  referencePressureKpa: number,
  { ratedFlowMlPerMin, ratedFlowBandPercent, ratedPressureKpa }: NonNullable<CheckAgainst["model"]>,
): OutsideTheBand[] {
  const ratedMlPerMin = ratedFlowMlPerMin * Math.sqrt(referencePressureKpa / ratedPressureKpa);
  return figures.injectors.flatMap(({ injectorId, staticFlow, heldOpen }) => {
    const mlPerMin = staticFlow?.value ?? heldOpen?.mlPerMin;
    if (mlPerMin === undefined) return [];
    const deviationPercent = (100 * (mlPerMin - ratedMlPerMin)) / ratedMlPerMin;
    if (!(Math.abs(deviationPercent) > ratedFlowBandPercent)) return [];
    return [
      {
        kind: "outside the model's band" as const,
        injectorId,
        pulseWidthMs: null,
        mlPerMin,
        ratedMlPerMin,
        deviationPercent,
        bandPercent: ratedFlowBandPercent,
      },
    ];
  });
}

/** Line and held open further apart than a sound injector's. */
export function findClosureOver5(figures: CycleFigures): ClosureOver5[] {
  return figures.injectors.flatMap(({ injectorId, closurePercent }) =>
    closurePercent !== null && Math.abs(closurePercent) > thresholds.closurePercent
      ? [{ kind: "closure over 5 %" as const, injectorId, pulseWidthMs: null, closurePercent }]
      : [],
  );
}
