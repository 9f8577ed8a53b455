import { type Fluid, fluidDensity } from "./fluid-density";

/**
 * Relative loss of density per kelvin, −(1/ρ)·dρ/dT, over one kelvin about the temperature (half of it at an end of the range).
 *
 * Units: °C in, 1/K out. Range and RangeErrors as `fluidDensity`.
 * Source: as `fluidDensity`; 0.00123 /K for n-heptane at 20 °C.
 */
export function fluidExpansion(fluid: Fluid, temperatureC: number): number {
  const density = fluidDensity(fluid, temperatureC);
  const [lowest, highest] = fluid === "n-heptane" ? [0, 40] : [-20, 90];
  const cooler = Math.max(lowest, temperatureC - 0.5);
  const warmer = Math.min(highest, temperatureC + 0.5);
  return (fluidDensity(fluid, cooler) - fluidDensity(fluid, warmer)) / (warmer - cooler) / density;
}
