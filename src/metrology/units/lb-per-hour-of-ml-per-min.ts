import { requireFinite, requireNumber } from "../limits";
import { gramsPerPound } from "./factors";

/**
 * Mass flow in lb/h of a volume flow in mL/min (cc/min), with the density it is made with: mL/min · ρ · 60 / 453.59237.
 *
 * Units: mL/min, g/mL. Range: flow within ±1e100, density above 0.
 * Throws RangeError naming mlPerMin or densityGPerMl.
 * Source: NIST SP 811 (2008), Appendix B, for the pound.
 */
export function lbPerHourOfMlPerMin(mlPerMin: number, densityGPerMl: number): number {
  requireNumber("mlPerMin", mlPerMin);
  requireNumber("densityGPerMl", densityGPerMl, { above: 0 });
  return requireFinite("mlPerMin, densityGPerMl", (mlPerMin * densityGPerMl * 60) / gramsPerPound);
}
