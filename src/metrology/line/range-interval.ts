import { type DrawOptions, drawnInterval, type Interval } from "../uncertainty/drawn-interval";

/**
 * Monte Carlo interval of the plain range (max − min) of values such as dead times or resistances; as `spreadInterval`.
 *
 * Units: those of the values. Range and RangeErrors as there, but the mean may be 0.
 * Source: JCGM 101:2008, 7.2 to 7.7.
 */
export function rangeInterval(
  values: readonly number[],
  u: number | readonly number[],
  options: DrawOptions = {},
): Interval {
  return drawnInterval(values, u, (min, max) => max - min, options);
}
