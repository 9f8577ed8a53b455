import type { BenchState } from "./types";

type Period = { validFrom: Date; validUntil: Date };

const dueWithinMs = 30 * 86_400_000;
/** Days end a moment before the next one starts; that moment is no gap. */
const noGapMs = 1000;

/** How long calibrations that follow one another cover from now on; null when none is in force. */
export function coveredUntil(periods: Period[], now: Date): Date | null {
  let until: Date | null = null;
  for (const period of periods.toSorted((a, b) => a.validFrom.getTime() - b.validFrom.getTime())) {
    const start: number = until ? until.getTime() + noGapMs : now.getTime();
    if (period.validFrom.getTime() <= start && period.validUntil > (until ?? now)) until = period.validUntil;
  }
  return until;
}

/** The first of all ends; null when one has ended already, or when there is nothing to rest on. */
export function firstEnd(ends: (Date | null)[]): Date | null {
  const times = ends.map((end) => end?.getTime() ?? Number.NaN);
  const first = Math.min(...times);
  return Number.isFinite(first) ? new Date(first) : null;
}

export function benchState(
  { retired, held, calibratedUntil }: { retired: boolean; held: boolean; calibratedUntil: Date | null },
  now: Date,
): BenchState {
  if (retired) return "retired";
  if (held) return "on hold";
  if (!calibratedUntil) return "overdue";
  return calibratedUntil.getTime() - now.getTime() < dueWithinMs ? "due" : "in calibration";
}
