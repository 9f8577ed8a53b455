import { requireFinite, requireNumber } from "../limits";
import { meanAndSd } from "./mean-and-sd";

export type Spread = {
  count: number;
  mean: number;
  min: number;
  max: number;
  range: number;
  spreadPercent: number;
  deviationsPercent: number[];
  maxDeviationPercent: number;
  cvPercent: number;
};

/**
 * How far the values of a set lie apart: spreadPercent = 100 · (max − min) / mean.
 *
 * `deviationsPercent` are 100 · (value − mean) / mean in the order given, `maxDeviationPercent` the largest of them
 * without its sign, `cvPercent` 100 · standard deviation (n − 1) / mean. No standard fixes a spread formula for
 * matching, so formula and denominator are printed wherever a spread is. For dead time and resistance use `range`:
 * a percentage of a small offset misleads.
 *
 * Units: any, the same for all. Range: two or more values within ±1e100 whose mean is not 0.
 * Throws RangeError for fewer values, a mean of 0, or values out of range.
 * Source: common practice, no source.
 */
export function spread(values: readonly number[]): Spread {
  if (values.length < 2) throw new RangeError(`values must be at least 2: ${values.length} were given`);
  values.forEach((value, index) => {
    requireNumber(`values[${index}]`, value);
  });
  const { mean, sd } = meanAndSd(values);
  if (mean === 0) throw new RangeError("values must have a mean other than 0: a spread is a share of it");
  const min = values.reduce((least, value) => Math.min(least, value));
  const max = values.reduce((most, value) => Math.max(most, value));
  const percent = (difference: number) => requireFinite("values", (100 * difference) / mean);
  const deviationsPercent = values.map((value) => percent(value - mean));
  return {
    count: values.length,
    mean,
    min,
    max,
    range: max - min,
    spreadPercent: percent(max - min),
    deviationsPercent,
    maxDeviationPercent: deviationsPercent.reduce((most, value) => Math.max(most, Math.abs(value)), 0),
    cvPercent: percent(sd),
  };
}
