import { requireFinite, requireNumber } from "../limits";

/**
 * Volume flow in mL/min of a mass flow in g/s: g/s · 60 / ρ.
 *
 * Units: g/s, g/mL. Range: flow within ±1e100, density above 0.
 * Throws RangeError naming gPerSecond or densityGPerMl.
 * Source: definition of density.
 */
export function mlPerMinOfGPerSecond(gPerSecond: number, densityGPerMl: number): number {
  requireNumber("gPerSecond", gPerSecond);
  requireNumber("densityGPerMl", densityGPerMl, { above: 0 });
  return requireFinite("gPerSecond, densityGPerMl", (gPerSecond * 60) / densityGPerMl);
}
