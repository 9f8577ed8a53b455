import { requireFinite, requireNumber } from "../limits";
import { tFactor } from "../uncertainty/t-factor";
import type { LineFit } from "./fit-line";

export type XIntercept = {
  value: number | null;
  standardError: number | null;
  interval: { low: number; high: number } | null;
};

/**
 * Where a fitted line crosses y = 0, with its standard error and interval. For y at another level fit y less that level.
 *
 * `standardError` is first-order propagation with the covariance of slope and intercept. `interval` is Fieller's, with
 * Student's t at the fit's degrees of freedom: it is not symmetric. It is null where the slope does not differ from
 * zero at that confidence (g ≥ 1), and where two points left nothing to estimate from. `value` stays −intercept/slope
 * then, as a quotient without a statement; a slope of exactly 0 has no crossing, and all three are null.
 *
 * Units: those of x. Range: confidence between 0 and 1.
 * Throws RangeError for a confidence out of range or numbers that overflow.
 * Sources: E. C. Fieller, J. R. Stat. Soc. B 16 (1954) 175-185; worked cases in Greenwell and Schubert Kabban, The R
 * Journal 6 (2014) 90-100.
 */
export function xIntercept(fit: LineFit, confidence = 0.95): XIntercept {
  const { slope, intercept, slopeSe, interceptSe, covariance, degreesOfFreedom } = fit;
  requireNumber("fit.slope", slope);
  requireNumber("fit.intercept", intercept);
  requireNumber("fit.degreesOfFreedom", degreesOfFreedom, { from: 0 });
  const t = tFactor(confidence, Math.max(1, degreesOfFreedom));
  if (slope === 0) return { value: null, standardError: null, interval: null };
  const value = requireFinite("fit", intercept === 0 ? 0 : -intercept / slope);
  if (slopeSe === null || interceptSe === null || covariance === null)
    return { value, standardError: null, interval: null };
  // Everything relative to the slope, so that scale drops out.
  const slopeVariance = (slopeSe / slope) ** 2;
  const interceptVariance = (interceptSe / slope) ** 2;
  const shared = covariance / slope / slope;
  const variance = Math.max(0, interceptVariance + 2 * value * shared + value * value * slopeVariance);
  const standardError = requireFinite("fit", Math.sqrt(variance));
  const g = t * t * slopeVariance;
  if (!(g < 1)) return { value, standardError, interval: null };
  const centre = value + (g * value + t * t * shared) / (1 - g);
  const joint = Math.max(0, interceptVariance * slopeVariance - shared * shared);
  const half = (t * Math.sqrt(Math.max(0, variance - t * t * joint))) / (1 - g);
  return {
    value,
    standardError,
    interval: { low: requireFinite("fit", centre - half), high: requireFinite("fit", centre + half) },
  };
}
