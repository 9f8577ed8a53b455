export type FlowSeries = {
  key: string;
  label: string;
  /** The line fitted over the linear range; null when there is none. */
  fit: { slopeUlPerMs: number; deadTimeMs: number } | null;
  points: readonly { pulseWidthMs: number; volumePerPulseUl: number; inLinearRange: boolean }[];
};

/** One row per pulse width; the key of an injector and a state is `left 3` or `found 3`. */
export function flowRows(left: readonly FlowSeries[], found: readonly FlowSeries[]) {
  const rows = new Map<number, Record<string, number>>();
  for (const [state, all] of [
    ["left", left],
    ["found", found],
  ] as const)
    for (const { key, points } of all)
      for (const { pulseWidthMs, volumePerPulseUl } of points) {
        const row = rows.get(pulseWidthMs) ?? { width: pulseWidthMs };
        row[`${state} ${key}`] = volumePerPulseUl;
        rows.set(pulseWidthMs, row);
      }
  return [...rows.values()].sort((a, b) => a.width! - b.width!);
}

/** The two ends of a fitted line: where it leaves zero, and the widest pulse. */
export function segmentOf({ fit }: FlowSeries, widest: number) {
  if (!fit) return null;
  const { slopeUlPerMs, deadTimeMs } = fit;
  return [
    { x: deadTimeMs, y: 0 },
    { x: widest, y: slopeUlPerMs * (widest - deadTimeMs) },
  ] as const;
}

export function meanDeadTime(series: readonly FlowSeries[]): number | null {
  const times = series.flatMap(({ fit }) => (fit ? [fit.deadTimeMs] : []));
  return times.length === 0 ? null : times.reduce((sum, time) => sum + time, 0) / times.length;
}
