import "server-only";
import { formatQuantity } from "../../format/format-number";
import type { SetCriterion, SetVerdict } from "../../metrology/cycle/types";
import type { Verdict } from "../../metrology/uncertainty/decide";
import type { MarkKind } from "../drawing/marks";

export function markOf(verdict: Verdict | null): MarkKind {
  return verdict ?? "none";
}

const overall: Record<Verdict, string> = {
  pass: "In tolerance: pass",
  "conditional pass": "Conditional pass",
  "conditional fail": "Conditional fail",
  fail: "Out of tolerance: fail",
};

export function overallWords({ verdict, criteria }: SetVerdict): string {
  if (verdict) return overall[verdict];
  return criteria.length === 0 ? "No criterion to judge" : "Not judged: a figure is missing";
}

export function criterionName({ kind, pulseWidthMs }: SetCriterion): string {
  const names: Record<SetCriterion["kind"], string> = {
    "spread at width": `Spread at ${formatQuantity(pulseWidthMs, "pulseWidth")}`,
    "static spread": "Spread of static flow",
    "dead-time range": "Range of dead times",
    "resistance range": "Range of resistances at 20 °C",
    leakage: "Leakage, each injector",
  };
  return names[kind];
}

export const criterionQuantity = {
  "%": "spread",
  ms: "deadTime",
  Ω: "resistance",
  "mm³/min": "leakage",
} as const;
