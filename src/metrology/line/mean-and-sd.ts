import { requireFinite } from "../limits";
import { sumOf } from "./sum-of";

/**
 * Arithmetic mean and sample standard deviation (n − 1), both from centred compensated sums.
 *
 * Units: those of the values. Range: at least one value; the standard deviation of a single one is 0.
 * Throws RangeError when the values are too large to square.
 * Source: definitions of JCGM 100:2008, 4.2.1 and 4.2.2; checked against NIST StRD NumAcc1 and NumAcc3.
 */
export function meanAndSd(values: readonly number[]): { mean: number; sd: number } {
  const count = values.length;
  const rough = sumOf(values) / count;
  const mean = rough + sumOf(values.map((value) => value - rough)) / count;
  const squares = sumOf(values.map((value) => (value - mean) ** 2));
  const sd = count > 1 ? Math.sqrt(squares / (count - 1)) : 0;
  return { mean: requireFinite("values", mean), sd: requireFinite("values", sd) };
}
