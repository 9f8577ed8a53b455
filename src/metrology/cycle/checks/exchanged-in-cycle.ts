import type { ExchangedInCycle } from "../doubt";
import type { CycleFigures } from "../types";
import { medianOf } from "./median-of";
import { thresholds } from "./thresholds";

type Pattern = { injectorId: string; now: number; before: number; change: number }[];

/**
 * Pairs whose static flows agree with an earlier cycle of the set far better when the two are exchanged. Changes are taken
 * against the set's median change, and against the scatter of the changes of the others: cleaning changes flows, and where
 * it changed them unevenly nothing is said.
 */
export function findExchangedInCycle(figures: CycleFigures, earlier: CycleFigures): ExchangedInCycle[] {
  let pattern = patternOf(figures, earlier);
  const found: ExchangedInCycle[] = [];
  for (;;) {
    const pairs = pattern.flatMap((a, index) =>
      pattern.slice(index + 1).flatMap((b) => pairOf(a, b, pattern) ?? []),
    );
    const [best] = pairs.sort((a, b) => a.left - b.left);
    if (!best) return found;
    found.push(best.doubt);
    const taken = [best.doubt.injectorId, best.doubt.otherInjectorId];
    pattern = pattern.filter(({ injectorId }) => !taken.includes(injectorId));
  }
}

/** Changes as shares, less the median change. */
function patternOf(figures: CycleFigures, earlier: CycleFigures): Pattern {
  const both = figures.injectors.flatMap(({ injectorId, staticFlow }) => {
    const before = earlier.injectors.find((other) => other.injectorId === injectorId)?.staticFlow;
    if (!staticFlow || !before || !(before.value > 0)) return [];
    return [{ injectorId, now: staticFlow.value, before: before.value }];
  });
  if (both.length === 0) return [];
  const usual = medianOf(both.map(({ now, before }) => now / before));
  return both.map((flow) => {
    const now = flow.now / usual;
    return { ...flow, now, change: now / flow.before - 1 };
  });
}

function pairOf(a: Pattern[number], b: Pattern[number], pattern: Pattern) {
  const { least, scatter, left: mayBeLeft } = thresholds.cycle;
  const others = pattern.filter((flow) => flow !== a && flow !== b).map(({ change }) => Math.abs(change));
  if (others.length < 2 || a.change * b.change >= 0) return null;
  const usual = 1.4826 * medianOf(others);
  const exchanged = [a.now / b.before - 1, b.now / a.before - 1] as const;
  const left = Math.hypot(...exchanged) / Math.hypot(a.change, b.change);
  const smaller = Math.min(Math.abs(a.change), Math.abs(b.change));
  if (smaller < Math.max(least, scatter * usual) || left > mayBeLeft) return null;
  const doubt: ExchangedInCycle = {
    kind: "two injectors exchanged in the cycle",
    injectorId: a.injectorId,
    otherInjectorId: b.injectorId,
    pulseWidthMs: null,
    changesPercent: [100 * a.change, 100 * b.change],
    exchangedPercent: [100 * exchanged[0], 100 * exchanged[1]],
  };
  return { doubt, left };
}
