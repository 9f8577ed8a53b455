import chiSquareQuantileOf from "@stdlib/stats-base-dists-chisquare-quantile";
import normalQuantileOf from "@stdlib/stats-base-dists-normal-quantile";
import tQuantileOf from "@stdlib/stats-base-dists-t-quantile";

const known = new Map<string, number>();

/** The library needs up to 0.1 ms for one value of t; a page asks for the same few again and again. */
function remembered(key: string, compute: () => number): number {
  const before = known.get(key);
  if (before !== undefined) return before;
  if (known.size > 1000) known.clear();
  const value = compute();
  known.set(key, value);
  return value;
}

/** Student's t that a share p of the distribution lies below; infinite degrees of freedom give the normal value. */
export function tQuantile(p: number, degreesOfFreedom: number): number {
  if (degreesOfFreedom > 1e9) return normalQuantile(p);
  return remembered(`t ${p} ${degreesOfFreedom}`, () => tQuantileOf(p, degreesOfFreedom));
}

/** Standard normal value that a share p of the distribution lies below. */
export function normalQuantile(p: number): number {
  return normalQuantileOf(p, 0, 1);
}

/** Chi-square value that a share p of the distribution lies below. */
export function chiSquareQuantile(p: number, degreesOfFreedom: number): number {
  return remembered(`χ² ${p} ${degreesOfFreedom}`, () => chiSquareQuantileOf(p, degreesOfFreedom));
}
