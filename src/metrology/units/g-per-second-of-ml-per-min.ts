import { requireFinite, requireNumber } from "../limits";

/**
 * Mass flow in g/s of a volume flow in mL/min: mL/min · ρ / 60.
 *
 * Units: mL/min, g/mL. Range: flow within ±1e100, density above 0.
 * Throws RangeError naming mlPerMin or densityGPerMl.
 * Source: definition of density.
 */
export function gPerSecondOfMlPerMin(mlPerMin: number, densityGPerMl: number): number {
  requireNumber("mlPerMin", mlPerMin);
  requireNumber("densityGPerMl", densityGPerMl, { above: 0 });
  return requireFinite("mlPerMin, densityGPerMl", (mlPerMin * densityGPerMl) / 60);
}
