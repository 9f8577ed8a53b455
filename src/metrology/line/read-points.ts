import { requireNumber } from "../limits";

/** `u`: standard uncertainty of y, given for all points or for none. */
export type Point = { x: number; y: number; u?: number };

/** Points as columns. Weights are (least u / u)², 1 where no uncertainty is given; `unit` is that least u, or null. */
export type Columns = { xs: number[]; ys: number[]; weights: number[]; unit: number | null };

/**
 * Checks points and lays them out for summing.
 * @throws RangeError naming x, y or u of the point, the count, or a mixture of points with and without u.
 */
export function readPoints(points: readonly Point[], atLeast: number): Columns {
  if (points.length < atLeast)
    throw new RangeError(`points must be at least ${atLeast}: ${points.length} were given`);
  const xs = points.map(({ x }, index) => requireNumber(`points[${index}].x`, x));
  const ys = points.map(({ y }, index) => requireNumber(`points[${index}].y`, y));
  const given = points.filter(({ u }) => u !== undefined).length;
  if (given === 0) return { xs, ys, weights: xs.map(() => 1), unit: null };
  if (given < points.length)
    throw new RangeError(`points must have u for all or for none: ${given} of ${points.length} have one`);
  const us = points.map(({ u }, index) => requireNumber(`points[${index}].u`, u!, { above: 0 }));
  const unit = us.reduce((least, u) => Math.min(least, u));
  return { xs, ys, weights: us.map((u) => (unit / u) ** 2), unit };
}
