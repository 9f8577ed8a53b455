import { requireFinite, requireNumber } from "../limits";

/**
 * Static flow in mL/min of a true volume collected while the injector was held open: 60 · mL / t.
 *
 * Units: mL, s. Range: volume within ±1e100, time above 0.
 * Throws RangeError naming volumeMl or openSeconds.
 * Source: definition.
 */
export function heldOpenMlPerMin(volumeMl: number, openSeconds: number): number {
  requireNumber("volumeMl", volumeMl);
  requireNumber("openSeconds", openSeconds, { above: 0 });
  return requireFinite("volumeMl, openSeconds", (60 * volumeMl) / openSeconds);
}
