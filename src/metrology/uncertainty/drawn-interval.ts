import { requireFinite, requireNumber, requireProbability } from "../limits";
import { standardNormals } from "./standard-normals";

export type DrawOptions = { confidence?: number; draws?: number; seed?: number };
export type Interval = { low: number; high: number };

/** What is asked of each drawn set of values. */
type Measure = (min: number, max: number, mean: number) => number;

/**
 * Monte Carlo interval of a figure of a set: each value is drawn from a normal distribution about itself, and the ends
 * cut off equal shares of the figures that follow.
 *
 * Throws RangeError naming values, u, confidence, draws or seed and the limit.
 * Source: JCGM 101:2008, 7.2 to 7.7.
 */
export function drawnInterval(
  values: readonly number[],
  u: number | readonly number[],
  measure: Measure,
  { confidence = 0.95, draws = 20_000, seed = 1 }: DrawOptions,
): Interval {
  const us = uncertaintiesOf(values, u);
  requireProbability("confidence", confidence);
  requireNumber("draws", draws, { from: 100, upTo: 1e6 });
  requireNumber("seed", seed, { from: -(2 ** 53), upTo: 2 ** 53 });
  const figures = drawFigures(values, us, measure, { draws: Math.floor(draws), seed });
  const cut = Math.round((figures.length * (1 - confidence)) / 2);
  return {
    low: requireFinite("values, u", figures[cut]!),
    high: requireFinite("values, u", figures[figures.length - 1 - cut]!),
  };
}

function uncertaintiesOf(values: readonly number[], u: number | readonly number[]): Float64Array {
  if (values.length < 2) throw new RangeError(`values must be at least 2: ${values.length} were given`);
  const us = typeof u === "number" ? values.map(() => u) : u;
  if (us.length !== values.length)
    throw new RangeError(
      `u must be one number or one for each of ${values.length} values: ${us.length} were given`,
    );
  values.forEach((value, index) => {
    requireNumber(`values[${index}]`, value);
    requireNumber(`u[${index}]`, us[index]!, { from: 0 });
  });
  return Float64Array.from(us);
}

function drawFigures(
  values: readonly number[],
  us: Float64Array,
  measure: Measure,
  { draws, seed }: { draws: number; seed: number },
): Float64Array {
  const count = values.length;
  const normals = standardNormals(seed, draws * count);
  const figures = new Float64Array(draws);
  for (let draw = 0; draw < draws; draw++) {
    let min = Number.POSITIVE_INFINITY;
    let max = Number.NEGATIVE_INFINITY;
    let sum = 0;
    for (let i = 0; i < count; i++) {
      const value = values[i]! + us[i]! * normals[draw * count + i]!;
      if (value < min) min = value;
      if (value > max) max = value;
      sum += value;
    }
    figures[draw] = measure(min, max, sum / count);
  }
  return figures.sort();
}
