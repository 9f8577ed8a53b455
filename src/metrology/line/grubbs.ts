import { requireFinite, requireNumber, requireProbability } from "../limits";
import { tQuantile } from "../uncertainty/quantiles";
import { meanAndSd } from "./mean-and-sd";

export type GrubbsTest = { statistic: number; critical: number; index: number; isOutlier: boolean };

/**
 * Grubbs' two-sided test for one outlying value: G = max |value − mean| / s, s with n − 1.
 *
 * `index` is where the value furthest from the mean stands (the first of equals), and `isOutlier` whether G exceeds the
 * critical value, which follows from Student's t at alpha/(2n). The largest G that three values can give is 1.1547 and
 * four 1.5 (critical at 5 %: 1.1543 and 1.4812): on a set of four the test has almost no power, and a page that shows it
 * says so. Values that are all alike give G = 0.
 *
 * Units: any. Range: at least three values within ±1e100, alpha between 0 and 1.
 * Throws RangeError for fewer values, alpha or values out of range.
 * Sources: ISO 5725-2:1994, 7.3.4 and Table 5; ASTM E178; F. E. Grubbs and G. Beck, Technometrics 14 (1972) 847-854.
 */
export function grubbs(values: readonly number[], alpha = 0.05): GrubbsTest {
  const count = values.length;
  if (count < 3) throw new RangeError(`values must be at least 3: ${count} were given`);
  values.forEach((value, index) => {
    requireNumber(`values[${index}]`, value);
  });
  requireProbability("alpha", alpha);
  const { mean, sd } = meanAndSd(values);
  const distances = values.map((value) => Math.abs(value - mean));
  const furthest = distances.reduce((most, distance) => Math.max(most, distance));
  const statistic = sd === 0 ? 0 : requireFinite("values", furthest / sd);
  const critical = criticalValue(count, alpha);
  return { statistic, critical, index: distances.indexOf(furthest), isOutlier: statistic > critical };
}

function criticalValue(count: number, alpha: number): number {
  const t = tQuantile(alpha / (2 * count), count - 2);
  // 1 / (1 + (n − 2)/t²) rather than t² / (n − 2 + t²): t² may be too large to hold.
  return ((count - 1) / Math.sqrt(count)) * Math.sqrt(1 / (1 + (count - 2) / t / t));
}
