import type { PresentedResults } from "@/data/certificates";
import { formatNumber, formatWithUncertainty } from "@/format/format-number";
import type { Quantity } from "@/format/quantities";
import type { SetCriterion } from "@/metrology/cycle/types";

/** One criterion of the tolerance class in both phases. */
export type CriterionRow = {
  key: string;
  kind: SetCriterion["kind"];
  pulseWidthMs: number | null;
  /** The injector's tag where the criterion is one injector's. */
  tag: string | null;
  limit: number;
  unit: string;
  found: SetCriterion | null;
  left: SetCriterion | null;
};

export function criterionRows({ injectors, asFound, asLeft }: PresentedResults): CriterionRow[] {
  const tags = new Map(injectors.map(({ injectorId, tag }) => [injectorId, tag]));
  const rows = new Map<string, CriterionRow>();
  const add = (criterion: SetCriterion, phase: "found" | "left") => {
    const key = [criterion.kind, criterion.pulseWidthMs, criterion.injectorId].join(" ");
    const row = rows.get(key) ?? startRow(key, criterion, tags);
    rows.set(key, { ...row, [phase]: criterion });
  };
  for (const criterion of asFound?.verdict.criteria ?? []) add(criterion, "found");
  for (const criterion of asLeft?.verdict.criteria ?? []) add(criterion, "left");
  return [...rows.values()].sort((one, other) => order(one) - order(other));
}

function startRow(key: string, criterion: SetCriterion, tags: Map<string, string>): CriterionRow {
  const { kind, pulseWidthMs = null, injectorId, limit, unit } = criterion;
  const tag = injectorId ? (tags.get(injectorId) ?? null) : null;
  return { key, kind, pulseWidthMs, tag, limit, unit, found: null, left: null };
}

const kinds: SetCriterion["kind"][] = [
  "spread at width",
  "static spread",
  "dead-time range",
  "resistance range",
  "leakage",
];

function order({ kind, pulseWidthMs }: CriterionRow): number {
  return kinds.indexOf(kind) * 10_000 + (pulseWidthMs ?? 0);
}

const quantityOf: Record<SetCriterion["kind"], Quantity> = {
  "spread at width": "spread",
  "static spread": "spread",
  "dead-time range": "deadTime",
  "resistance range": "resistance",
  leakage: "leakage",
};

export function nameOf({ kind, pulseWidthMs, tag }: CriterionRow): string {
  if (kind === "spread at width") return `Spread at ${formatNumber(pulseWidthMs, "pulseWidth")} ms`;
  if (kind === "leakage") return tag ? `Leakage, ${tag}` : "Leakage";
  return {
    "static spread": "Spread of static flow",
    "dead-time range": "Range of dead time",
    "resistance range": "Range of winding resistance",
  }[kind];
}

export function limitText({ kind, limit, unit }: CriterionRow): string {
  return `${formatNumber(limit, quantityOf[kind])} ${unit}`;
}

export function valueText(criterion: SetCriterion | null): string {
  if (!criterion) return "–";
  if (criterion.value === null) return "no figure";
  return formatWithUncertainty(criterion.value, criterion.expandedUncertainty, quantityOf[criterion.kind]);
}
