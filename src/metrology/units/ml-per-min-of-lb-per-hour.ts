import { requireFinite, requireNumber } from "../limits";
import { gramsPerPound } from "./factors";

/**
 * Volume flow in mL/min (cc/min) of a mass flow in lb/h: lb/h · 453.59237 / 60 / ρ.
 *
 * It needs the density: 10.5 cc/min per lb/h (common practice, no source) holds only at 0.72 g/mL, and for n-heptane at
 * 20 °C it is 11.06. So a flow in lb/h is always shown with the density it was made with.
 *
 * Units: lb/h, g/mL. Range: flow within ±1e100, density above 0.
 * Throws RangeError naming lbPerHour or densityGPerMl.
 * Source: NIST SP 811 (2008), Appendix B, for the pound.
 */
export function mlPerMinOfLbPerHour(lbPerHour: number, densityGPerMl: number): number {
  requireNumber("lbPerHour", lbPerHour);
  requireNumber("densityGPerMl", densityGPerMl, { above: 0 });
  return requireFinite("lbPerHour, densityGPerMl", (lbPerHour * gramsPerPound) / 60 / densityGPerMl);
}
