import { requireFinite, requireNumber } from "../limits";
import { sumOf } from "../line/sum-of";
import { tFactor } from "./t-factor";

/** `sensitivity` is 1 where it is not given, `degreesOfFreedom` infinite. */
export type UncertaintyComponent = {
  name: string;
  standardUncertainty: number;
  sensitivity?: number;
  degreesOfFreedom?: number;
};

export type CombinedUncertainty = {
  standardUncertainty: number;
  effectiveDegreesOfFreedom: number;
  coverageFactor: number;
  expandedUncertainty: number;
};

/**
 * Combines the parts of an uncertainty budget that do not depend on each other into an expanded uncertainty.
 *
 * Root of the sum of squares of sensitivity · standard uncertainty; effective degrees of freedom by Welch and
 * Satterthwaite, truncated to an integer, as which they are returned; coverage factor is Student's t for them. They are
 * Infinity when no part that counts has finite ones, and the factor is then the normal one.
 *
 * Units: standard uncertainties in those of their input, sensitivities in output per input. Range: standard
 * uncertainties from 0 up, degrees of freedom from 1 up, confidence between 0 and 1.
 * Throws RangeError naming the component and the limit, or for no components.
 * Source: JCGM 100:2008 (GUM), 5.1.2, G.4.1 and G.6.4; its example H.1 gives 16 degrees of freedom and 93 nm at 99 %.
 */
export function combineUncertainty(
  components: readonly UncertaintyComponent[],
  confidence = 0.95,
): CombinedUncertainty {
  if (components.length === 0) throw new RangeError("components must be at least 1: none was given");
  const parts = components.map(partOf);
  const largest = parts.reduce((most, { u }) => Math.max(most, u), 0);
  const shares = parts.map(({ u, degreesOfFreedom }) => ({
    square: largest === 0 ? 0 : (u / largest) ** 2,
    degreesOfFreedom,
  }));
  const squares = sumOf(shares.map(({ square }) => square));
  const standardUncertainty = largest * Math.sqrt(squares);
  const scatter = sumOf(shares.map(({ square, degreesOfFreedom }) => square ** 2 / degreesOfFreedom));
  const effectiveDegreesOfFreedom = truncate(
    scatter === 0 ? Number.POSITIVE_INFINITY : squares ** 2 / scatter,
  );
  const coverageFactor = tFactor(confidence, effectiveDegreesOfFreedom);
  const expandedUncertainty = requireFinite("components", coverageFactor * standardUncertainty);
  return { standardUncertainty, effectiveDegreesOfFreedom, coverageFactor, expandedUncertainty };
}

function partOf({ name, standardUncertainty, sensitivity = 1, degreesOfFreedom }: UncertaintyComponent) {
  requireNumber(`standardUncertainty of ${name}`, standardUncertainty, { from: 0 });
  requireNumber(`sensitivity of ${name}`, sensitivity);
  if (degreesOfFreedom === undefined || degreesOfFreedom === Number.POSITIVE_INFINITY)
    return { u: Math.abs(sensitivity * standardUncertainty), degreesOfFreedom: Number.POSITIVE_INFINITY };
  requireNumber(`degreesOfFreedom of ${name}`, degreesOfFreedom, { from: 1 });
  return { u: Math.abs(sensitivity * standardUncertainty), degreesOfFreedom };
}

/** 4.999999999999999 is 5: rounding of a quotient must not cost a degree of freedom. */
function truncate(degreesOfFreedom: number): number {
  return Math.floor(degreesOfFreedom * (1 + 1e-12));
}
