import { grubbs } from "../../line/grubbs";
import type { OutlierAtWidth } from "../doubt";
import type { Grid } from "./grid";
import { thresholds } from "./thresholds";

/** Whether a reading is in doubt for another reason already. */
type InDoubt = (injectorId: string, width: number) => boolean;

/**
 * Injectors that stand out of the set at a width by Grubbs' test, each at the width where it does so most. Readings in doubt
 * already are left out, since they would hide or make others.
 */
export function findOutliersAtWidths({ rows, widths }: Grid, isInDoubt: InDoubt): OutlierAtWidth[] {
  const found = widths.flatMap((width) => {
    const read = rows.flatMap(({ injectorId, cells }) => {
      const cell = cells.get(width);
      return cell && !isInDoubt(injectorId, width) ? [{ injectorId, flow: cell.flow }] : [];
    });
    return outlierAmong(read, width) ?? [];
  });
  const byInjector = new Map<string, OutlierAtWidth>();
  for (const outlier of found) {
    const before = byInjector.get(outlier.injectorId);
    if (!before || outlier.statistic > before.statistic) byInjector.set(outlier.injectorId, outlier);
  }
  return [...byInjector.values()];
}

function outlierAmong(read: { injectorId: string; flow: number }[], width: number): OutlierAtWidth | null {
  const { alpha, least, weakUpTo } = thresholds.outlier;
  if (read.length < 3) return null;
  const test = grubbs(
    read.map(({ flow }) => flow),
    alpha,
  );
  const { injectorId, flow } = read[test.index]!;
  const ofOthers = (read.reduce((sum, other) => sum + other.flow, 0) - flow) / (read.length - 1);
  const deviation = (flow - ofOthers) / ofOthers;
  if (!test.isOutlier || !(Math.abs(deviation) > least) || !Number.isFinite(deviation)) return null;
  return {
    kind: "outlier at a width",
    injectorId,
    pulseWidthMs: width,
    volumePerPulseUl: flow,
    deviationPercent: 100 * deviation,
    statistic: test.statistic,
    critical: test.critical,
    count: read.length,
    weak: read.length <= weakUpTo,
  };
}
