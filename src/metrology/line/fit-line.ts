import { requireFinite } from "../limits";
import { type Columns, type Point, readPoints } from "./read-points";
import { sumOf } from "./sum-of";

/** The error terms are null where nothing is left to estimate them from. */
export type LineFit = {
  slope: number;
  intercept: number;
  slopeSe: number | null;
  interceptSe: number | null;
  covariance: number | null;
  residualSd: number | null;
  rSquared: number;
  degreesOfFreedom: number;
};

/**
 * Straight line y = intercept + slope · x by least squares from centred, compensated sums.
 *
 * With `u` (standard uncertainty of y, for all points or for none) the weights are 1/u², the error terms follow from
 * the u's alone and `residualSd` is the root of the reduced chi-square. Without, the error terms follow from the
 * scatter, and `residualSd` is that scatter (n − 2). Two points give a line without error terms or `residualSd`.
 * `rSquared` is 0 where every y is the same: there is nothing to explain.
 *
 * Units: slope in y per x. Range: x, y within ±1e100, u above 0; x further apart than about 1e-145.
 * Throws RangeError for fewer than two points, x all alike, or numbers out of range.
 * Sources: NIST StRD (Norris) for the sums; ISO/TS 28037:2010, clause 6, for the weighted line.
 */
export function fitLine(points: readonly Point[]): LineFit {
  const columns = readPoints(points, 2);
  const centre = centreOf(columns);
  const dx = columns.xs.map((x) => x - centre.x);
  const dy = columns.ys.map((y) => y - centre.y);
  const { weights, unit } = columns;
  const sxx = sumOf(dx.map((x, i) => weights[i]! * x * x));
  if (!(sxx > 1e-290)) throw new RangeError("points must have two different x at least (limit 1e-145 apart)");
  const slope = sumOf(dx.map((x, i) => weights[i]! * x * dy[i]!)) / sxx;
  const squares = sumOf(dx.map((x, i) => weights[i]! * (dy[i]! - slope * x) ** 2));
  const degreesOfFreedom = points.length - 2;
  return {
    slope: requireFinite("points", slope),
    intercept: requireFinite("points", centre.y - slope * centre.x),
    ...errorTerms({ squares, sxx, weight: centre.weight, centreX: centre.x, unit, degreesOfFreedom }),
    rSquared: explained(squares, sumOf(dy.map((y, i) => weights[i]! * y * y))),
    degreesOfFreedom,
  };
}

/** Weighted mean, taken twice so that its own rounding is taken off. */
function centreOf({ xs, ys, weights }: Columns): { x: number; y: number; weight: number } {
  const weight = sumOf(weights);
  const mean = (values: number[]) => {
    const rough = sumOf(values.map((value, i) => weights[i]! * value)) / weight;
    return rough + sumOf(values.map((value, i) => weights[i]! * (value - rough))) / weight;
  };
  return { x: mean(xs), y: mean(ys), weight };
}

type Scatter = {
  squares: number;
  sxx: number;
  weight: number;
  centreX: number;
  unit: number | null;
  degreesOfFreedom: number;
};

function errorTerms({ squares, sxx, weight, centreX, unit, degreesOfFreedom }: Scatter) {
  if (degreesOfFreedom === 0) return { slopeSe: null, interceptSe: null, covariance: null, residualSd: null };
  const scatter = Math.sqrt(squares / degreesOfFreedom);
  const sd = unit ?? scatter;
  const slopeSe = sd / Math.sqrt(sxx);
  return {
    slopeSe: requireFinite("points", slopeSe),
    interceptSe: requireFinite("points", Math.hypot(sd / Math.sqrt(weight), centreX * slopeSe)),
    covariance: requireFinite("points", -centreX * slopeSe * slopeSe),
    residualSd: requireFinite("points", unit === null ? scatter : scatter / unit),
  };
}

/** Share of the scatter of y that the line takes away, 0 to 1. */
export function explained(squaresLeft: number, squaresAtFirst: number): number {
  return squaresAtFirst > 0 ? Math.min(1, Math.max(0, 1 - squaresLeft / squaresAtFirst)) : 0;
}
