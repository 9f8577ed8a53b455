import { type DrawOptions, drawnInterval, type Interval } from "../uncertainty/drawn-interval";
import { spread } from "./spread";

/**
 * Monte Carlo interval of spreadPercent, given the standard uncertainty of each value (or one for all).
 *
 * Only what differs between the injectors of one run belongs into `u`: what all share (rail pressure, fluid temperature,
 * driver) cancels in a spread. Where the spread is not large against `u` the drawn spreads lie above the measured one, as
 * a range of noisy values does: the interval then errs to the high side and need not hold the measured spread.
 *
 * Units: values and u alike, result in percent. Range: two values at least, mean well away from 0 against u, u from 0
 * up, draws 100 to 1 000 000, confidence between 0 and 1. The same seed gives the same interval.
 * Throws RangeError naming values, u, confidence, draws or seed and its limit.
 * Source: JCGM 101:2008, 7.2 to 7.7.
 */
export function spreadInterval(
  values: readonly number[],
  u: number | readonly number[],
  options: DrawOptions = {},
): Interval {
  spread(values);
  return drawnInterval(values, u, (min, max, mean) => (100 * (max - min)) / mean, options);
}
