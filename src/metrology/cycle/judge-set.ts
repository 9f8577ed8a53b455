import { decide, type Verdict } from "../uncertainty/decide";
import type {
  CycleFigures,
  MeasuredLeakage,
  MeasuredResistance,
  SetCriterion,
  SetVerdict,
  ToleranceClass,
} from "./types";

export type JudgeInput = {
  figures: CycleFigures;
  toleranceClass: ToleranceClass;
  resistances?: readonly MeasuredResistance[];
  leakages?: readonly MeasuredLeakage[];
  /** mm³/min for each injector; leakage is not judged without it. */
  leakageLimit?: number;
};

const decisionRule =
  "Each limit is judged by the non-binary rule of ILAC-G8:09/2019 with a guard band as wide as the expanded uncertainty (w = U): at a limit, a pass is wrong with a probability of at most 2.5 %.";

const fromBest: readonly Verdict[] = ["pass", "conditional pass", "conditional fail", "fail"];

/**
 * Verdict on a set against a tolerance class: each criterion by `decide`, the whole by its worst.
 *
 * The uncertainty of a spread or of the dead-time range is half the width of its 95 % Monte Carlo interval; that of the
 * resistance range joins those of the two ends. A criterion whose figure is missing has the verdict null, and so has the
 * set; so has a limit on spread that holds from a width where nothing was measured up to the next, and a class that
 * limits nothing.
 *
 * Units: %, ms, Ω, mm³/min. Throws RangeError for limits or uncertainties out of range.
 * Source: ILAC-G8:09/2019, w = U.
 */
export function judgeSet(input: JudgeInput): SetVerdict {
  const criteria = [
    ...spreadsAtWidths(input),
    ...staticSpread(input),
    ...deadTimeRange(input),
    ...resistanceRange(input),
    ...leakage(input),
  ];
  const verdicts = criteria.map(({ verdict }) => verdict);
  const isWhole = verdicts.length > 0 && !verdicts.includes(null);
  const worst = Math.max(...verdicts.map((verdict) => fromBest.indexOf(verdict ?? "pass")));
  return { criteria, verdict: isWhole ? fromBest[worst]! : null, decisionRule };
}

type Figure = { value: number; expandedUncertainty: number } | null;
type Named = Pick<SetCriterion, "kind" | "pulseWidthMs" | "injectorId" | "limit" | "unit">;

function criterion(named: Named, figure: Figure): SetCriterion {
  if (!figure) return { ...named, value: null, expandedUncertainty: 0, verdict: null };
  return {
    ...named,
    ...figure,
    verdict: decide(figure.value, { high: named.limit }, figure.expandedUncertainty),
  };
}

function spreadsAtWidths({ figures, toleranceClass }: JudgeInput): SetCriterion[] {
  const limits = [...toleranceClass.spreadLimits].sort((a, b) => a.fromPulseWidthMs - b.fromPulseWidthMs);
  const measured = measuredWidths(figures);
  return limits.flatMap(({ fromPulseWidthMs, spreadPercent }, index) => {
    const end = limits[index + 1]?.fromPulseWidthMs ?? Number.POSITIVE_INFINITY;
    const within = measured.filter((width) => width >= fromPulseWidthMs && width < end);
    const judged = within.length > 0 ? within : [fromPulseWidthMs];
    return judged.map((pulseWidthMs) =>
      criterion(
        { kind: "spread at width", pulseWidthMs, limit: spreadPercent, unit: "%" },
        spreadAt(figures, pulseWidthMs),
      ),
    );
  });
}

/** Widths that one injector at least was pulsed at, whether or not the others were too. */
function measuredWidths({ injectors }: CycleFigures): number[] {
  const pulsed = injectors.flatMap(({ flows }) => flows.filter(({ dutyPercent }) => dutyPercent < 100));
  return [...new Set(pulsed.map((flow) => flow.pulseWidthMs))].sort((a, b) => a - b);
}

function spreadAt({ widths }: CycleFigures, pulseWidthMs: number): Figure {
  return ofSpread(widths.find((width) => width.pulseWidthMs === pulseWidthMs)?.spread ?? null);
}

function ofSpread(spread: CycleFigures["staticSpread"]): Figure {
  return spread && { value: spread.spreadPercent, expandedUncertainty: spread.expandedUncertainty };
}

function staticSpread({ figures, toleranceClass }: JudgeInput): SetCriterion[] {
  const limit = toleranceClass.staticSpreadPercent;
  if (limit === null) return [];
  return [criterion({ kind: "static spread", limit, unit: "%" }, ofSpread(figures.staticSpread))];
}

function deadTimeRange({ figures, toleranceClass }: JudgeInput): SetCriterion[] {
  const limit = toleranceClass.deadTimeRangeMs;
  if (limit === null) return [];
  const range = figures.deadTimeRange;
  const figure = range && { value: range.rangeMs, expandedUncertainty: range.expandedUncertainty };
  return [criterion({ kind: "dead-time range", limit, unit: "ms" }, figure)];
}

function resistanceRange({ figures, toleranceClass, resistances = [] }: JudgeInput): SetCriterion[] {
  const limit = toleranceClass.resistanceRangeOhm;
  if (limit === null) return [];
  const known = figures.injectors.flatMap(
    ({ injectorId }) => resistances.find((resistance) => resistance.injectorId === injectorId) ?? [],
  );
  const isWhole = known.length === figures.injectors.length && known.length > 1;
  return [criterion({ kind: "resistance range", limit, unit: "Ω" }, isWhole ? rangeOf(known) : null)];
}

function rangeOf(resistances: readonly MeasuredResistance[]): Figure {
  const sorted = [...resistances].sort((a, b) => a.ohmsAt20C - b.ohmsAt20C);
  const [lowest, highest] = [sorted[0]!, sorted.at(-1)!];
  return {
    value: highest.ohmsAt20C - lowest.ohmsAt20C,
    expandedUncertainty: Math.hypot(lowest.expandedUncertainty, highest.expandedUncertainty),
  };
}

function leakage({ figures, leakages = [], leakageLimit }: JudgeInput): SetCriterion[] {
  if (leakageLimit === undefined) return [];
  return figures.injectors.map(({ injectorId }) => {
    const found = leakages.find((candidate) => candidate.injectorId === injectorId);
    const figure = found && { value: found.mm3PerMin, expandedUncertainty: found.expandedUncertainty ?? 0 };
    return criterion({ kind: "leakage", injectorId, limit: leakageLimit, unit: "mm³/min" }, figure ?? null);
  });
}
