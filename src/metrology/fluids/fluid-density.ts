import { requireNumber } from "../limits";
import { monotoneCubic } from "../line/monotone-cubic";
import { nHeptaneDensity } from "../published/n-heptane-density";

/** Any fluid but n-heptane brings its density and its expansion coefficient, both at 15 °C, from its own record. */
export type Fluid = "n-heptane" | { name: string; densityAt15GPerMl: number; expansionPerK: number };

const nHeptaneKgPerM3 = monotoneCubic(
  nHeptaneDensity.map(([celsius]) => celsius),
  nHeptaneDensity.map(([, density]) => density),
);

/**
 * Density of a test fluid in g/mL at its temperature, at atmospheric pressure (300 kPa compress n-heptane by 0.04 %).
 *
 * n-heptane: monotone cubic through published values; it expands 0.123 % per K near 20 °C. Other fluids:
 * ρ = ρ15 · exp(−α·Δt·(1 + 0.8·α·Δt)), Δt = t − 15, with α at 15 °C.
 *
 * Units: °C, g/mL, 1/K. Range: n-heptane 0 to 40 °C; others −20 to 90 °C, density 0.3 to 2 g/mL, expansion 0 to 0.003 /K.
 * Throws RangeError naming temperatureC, densityAt15GPerMl or expansionPerK and its limits.
 * Sources: Span and Wagner, Int. J. Thermophys. 24 (2003) 41 (n-heptane); ASTM D1250-80 / API MPMS 11.1, Table 54 (others).
 */
export function fluidDensity(fluid: Fluid, temperatureC: number): number {
  if (fluid === "n-heptane") {
    requireNumber("temperatureC of n-heptane", temperatureC, { from: 0, upTo: 40 });
    return nHeptaneKgPerM3(temperatureC) / 1000;
  }
  requireNumber("temperatureC", temperatureC, { from: -20, upTo: 90 });
  requireNumber("densityAt15GPerMl", fluid.densityAt15GPerMl, { from: 0.3, upTo: 2 });
  requireNumber("expansionPerK", fluid.expansionPerK, { from: 0, upTo: 0.003 });
  const expansion = fluid.expansionPerK * (temperatureC - 15);
  return fluid.densityAt15GPerMl * Math.exp(-expansion * (1 + 0.8 * expansion));
}
