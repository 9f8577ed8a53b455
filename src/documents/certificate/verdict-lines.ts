import "server-only";
import type { SetCriterion } from "../../metrology/cycle/types";
import type { Verdict } from "../../metrology/uncertainty/decide";
import type { CertificateContent } from "./content";
import { criterionName } from "./verdict-words";

type Judged = Pick<SetCriterion, "value" | "expandedUncertainty" | "verdict">;
export type VerdictLine = {
  name: string;
  unit: SetCriterion["unit"];
  limit: number;
  found: Judged | null;
  left: Judged;
};

const fromBest: readonly (Verdict | null)[] = ["pass", "conditional pass", "conditional fail", "fail", null];

/** The criteria as left with their counterparts as found; leakage, judged injector by injector, in one line and its exceptions. */
export function verdictLines({ asFound, asLeft, injectors }: CertificateContent): VerdictLine[] {
  const found = asFound.verdict.criteria;
  const left = asLeft.verdict.criteria;
  const single = (criterion: SetCriterion, name = criterionName(criterion)): VerdictLine => ({
    name,
    unit: criterion.unit,
    limit: criterion.limit,
    found: found.find((other) => isSame(other, criterion)) ?? null,
    left: criterion,
  });
  const leakages = left.filter(isLeakage);
  const tagOf = (id?: string) => injectors.find(({ injectorId }) => injectorId === id)?.tag ?? "";
  return [
    ...left.filter((criterion) => !isLeakage(criterion)).map((criterion) => single(criterion)),
    ...(leakages.length > 0 ? [worstLeakage(leakages, found.filter(isLeakage))] : []),
    ...leakages
      .filter(({ verdict }) => verdict !== "pass")
      .map((criterion) => single(criterion, `Leakage of ${tagOf(criterion.injectorId)}`)),
  ];
}

function worstLeakage(left: readonly SetCriterion[], found: readonly SetCriterion[]): VerdictLine {
  const { unit, limit } = left[0]!;
  return {
    name: left.length > 1 ? `Leakage, largest of ${left.length}` : "Leakage",
    unit,
    limit,
    found: found.length > 0 ? worst(found) : null,
    left: worst(left),
  };
}

function worst(criteria: readonly SetCriterion[]): Judged {
  const values = criteria.flatMap(({ value }) => (value === null ? [] : [value]));
  const ranks = criteria.map(({ verdict }) => fromBest.indexOf(verdict));
  return {
    value: values.length > 0 ? Math.max(...values) : null,
    expandedUncertainty: Math.max(...criteria.map(({ expandedUncertainty }) => expandedUncertainty)),
    verdict: fromBest[Math.max(...ranks)]!,
  };
}

function isLeakage({ kind }: SetCriterion): boolean {
  return kind === "leakage";
}

function isSame(one: SetCriterion, other: SetCriterion): boolean {
  return (
    one.kind === other.kind && one.pulseWidthMs === other.pulseWidthMs && one.injectorId === other.injectorId
  );
}
