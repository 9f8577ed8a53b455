import type { CertifiedPhase, PresentedResults } from "@/data/certificates";
import { formatNumber } from "@/format/format-number";
import type { SetCriterion } from "@/metrology/cycle/types";
import { BeforeAfter } from "@/ui/layout/before-after";

/** The last row of the big table: spreads in percent, ranges for dead time and winding. */
export function spreadFoot({ asFound, asLeft }: PresentedResults) {
  const both = (read: (phase: CertifiedPhase | null) => string) => (
    <BeforeAfter before={read(asFound)} after={read(asLeft)} />
  );
  return {
    width: (pulseWidthMs: number) => both((phase) => formatNumber(spreadAt(phase, pulseWidthMs), "spread")),
    staticFlow: both((phase) => formatNumber(phase?.figures.staticSpread?.spreadPercent, "spread")),
    deadTime: both((phase) => formatNumber(phase?.figures.deadTimeRange?.rangeMs, "deadTime")),
    resistance: both((phase) => formatNumber(judgedValue(phase, "resistance range"), "resistance")),
  };
}

function spreadAt(phase: CertifiedPhase | null, pulseWidthMs: number): number | undefined {
  return phase?.figures.widths.find((width) => width.pulseWidthMs === pulseWidthMs)?.spread?.spreadPercent;
}

function judgedValue(phase: CertifiedPhase | null, kind: SetCriterion["kind"]): number | null {
  return phase?.verdict.criteria.find((criterion) => criterion.kind === kind)?.value ?? null;
}
