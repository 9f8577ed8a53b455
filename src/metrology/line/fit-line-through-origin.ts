import { requireFinite } from "../limits";
import { explained, type LineFit } from "./fit-line";
import { type Point, readPoints } from "./read-points";
import { sumOf } from "./sum-of";

/**
 * Straight line y = slope · x through the origin by least squares; shape as `fitLine`, with the intercept exactly 0.
 *
 * Degrees of freedom are n − 1; a single point gives a line without error terms. `rSquared` is the uncentred one
 * (against Σy², as NIST certifies it), so it cannot be compared with that of a line with an intercept.
 *
 * Units: slope in y per x. Range: x, y within ±1e100, u above 0; some x further from 0 than about 1e-145.
 * Throws RangeError for no points, x all 0, or numbers out of range.
 * Source: NIST StRD (NoInt1).
 */
export function fitLineThroughOrigin(points: readonly Point[]): LineFit {
  const { xs, ys, weights, unit } = readPoints(points, 1);
  const sxx = sumOf(xs.map((x, i) => weights[i]! * x * x));
  if (!(sxx > 1e-290)) throw new RangeError("points must have one x at least that is not 0 (limit 1e-145)");
  const slope = requireFinite("points", sumOf(xs.map((x, i) => weights[i]! * x * ys[i]!)) / sxx);
  const squares = sumOf(xs.map((x, i) => weights[i]! * (ys[i]! - slope * x) ** 2));
  const rSquared = explained(squares, sumOf(ys.map((y, i) => weights[i]! * y * y)));
  const degreesOfFreedom = points.length - 1;
  if (degreesOfFreedom === 0)
    return {
      slope,
      intercept: 0,
      slopeSe: null,
      interceptSe: null,
      covariance: null,
      residualSd: null,
      rSquared,
      degreesOfFreedom,
    };
  const scatter = Math.sqrt(squares / degreesOfFreedom);
  return {
    slope,
    intercept: 0,
    slopeSe: requireFinite("points", (unit ?? scatter) / Math.sqrt(sxx)),
    interceptSe: 0,
    covariance: 0,
    residualSd: requireFinite("points", unit === null ? scatter : scatter / unit),
    rSquared,
    degreesOfFreedom,
  };
}
