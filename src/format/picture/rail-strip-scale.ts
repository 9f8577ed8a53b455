import { niceCeiling } from "./nice-ticks";

export type Percents = readonly (number | null | undefined)[];

/** Bars beyond this many half limits are cut, so that one bad bar does not flatten all others. */
const mostHalfLimits = 6;
/** Without a limit, one bar that hardly flows must not flatten the others either. */
const mostPercent = 25;
const leastPercent = 0.5;

/** The deviation in percent that reaches the top or bottom of the strip. */
export function railStripHalfScale(found: Percents, left: Percents, halfLimitPercent: number | null): number {
  const ceiling = halfLimitPercent ? Math.max(halfLimitPercent * mostHalfLimits, leastPercent) : mostPercent;
  const longest = Math.min(Math.max(largest(found), largest(left)), ceiling);
  const shown = Math.max(longest, (halfLimitPercent ?? 0) * 1.4, leastPercent);
  return Math.min(niceCeiling(shown), Math.max(ceiling, shown));
}

function largest(percents: Percents): number {
  return percents.reduce<number>((most, percent) => Math.max(most, Math.abs(percent ?? 0)), 0);
}
