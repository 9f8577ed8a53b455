import type { NotRising } from "../doubt";
import type { Row } from "./grid";
import { thresholds } from "./thresholds";

/** Readings that are no more than those at the next shorter width, though a rise should have shown above the noise. */
export function findNotRising({ injectorId, cells }: Row): NotRising[] {
  const columns = [...cells].flatMap(([column, cell]) =>
    column === null ? [] : [{ width: column, ...cell }],
  );
  const sorted = columns.sort((a, b) => a.width - b.width);
  const [first, last] = [sorted[0], sorted.at(-1)];
  if (!first || !last || first === last) return [];
  const slope = Math.max(0, (last.flow - first.flow) / (last.width - first.width));
  return sorted.slice(1).flatMap((longer, index) => {
    const shorter = sorted[index]!;
    const rise = longer.flow - shorter.flow;
    const missing = slope * (longer.width - shorter.width) - rise;
    if (rise > 0 || missing <= thresholds.coverage * Math.hypot(longer.u, shorter.u)) return [];
    return [
      {
        kind: "not rising" as const,
        injectorId,
        pulseWidthMs: longer.width,
        volumePerPulseUl: longer.flow,
        shorterPulseWidthMs: shorter.width,
        shorterVolumePerPulseUl: shorter.flow,
      },
    ];
  });
}
