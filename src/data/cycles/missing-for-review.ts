import "server-only";
import type { workItems } from "../../db/vocabulary";
import { formatNumber } from "../../format/format-number";
import type { SetCriterion } from "../../metrology/cycle/types";
import type { PhaseResults, SetResults } from "./results";
import type { SheetInjector } from "./sheet/types";

/** What a set lacks before its results can be reviewed. A spray photo is welcome, not needed. */
export function missingForReview(
  results: SetResults,
  workAsked: readonly (typeof workItems)[number][],
  injectors: SheetInjector[],
): string[] {
  const { asFound, asLeft, toleranceClass } = results;
  if (!asFound) return ["No cycle as found is recorded."];
  if (!asLeft) return ["No cycle as left is recorded."];
  const windings = workAsked.includes("winding check") || toleranceClass.resistanceRangeOhm !== null;
  const leakages = asLeft.verdict.criteria.some((criterion) => criterion.kind === "leakage");
  return [
    ...injectors.flatMap(({ setInjectorId, tag }) =>
      lacking(asLeft, setInjectorId, tag, { windings, leakages }),
    ),
    ...unjudged(asLeft.verdict.criteria),
  ];
}

function lacking(
  asLeft: PhaseResults,
  setInjectorId: string,
  tag: string,
  asked: { windings: boolean; leakages: boolean },
): string[] {
  const measured = asLeft.injectors.find((injector) => injector.setInjectorId === setInjectorId);
  if (!measured) return [`${tag} was not measured as left.`];
  const figures = asLeft.figures.injectors.find((injector) => injector.injectorId === setInjectorId);
  const missing: string[] = [];
  if (!figures?.flowLine)
    missing.push(`${tag} has no flow line: ${figures?.lineProblem ?? "nothing was read."}`);
  if (asked.windings && !measured.resistance) missing.push(`${tag} has no winding resistance.`);
  if (asked.leakages && measured.checks.leakageMm3PerMin === null)
    missing.push(`${tag} has no leakage check.`);
  return missing;
}

function unjudged(criteria: SetCriterion[]): string[] {
  return criteria
    .filter(({ verdict, kind }) => verdict === null && kind !== "leakage" && kind !== "resistance range")
    .map(({ kind, pulseWidthMs }) => {
      const width = pulseWidthMs === undefined ? "" : ` of ${formatNumber(pulseWidthMs, "pulseWidth")} ms`;
      return `The ${kind}${width} cannot be judged: an injector lacks a figure for it.`;
    });
}
