import { requireFinite, requireNumber } from "../limits";

export type FlowCorrection = {
  basis: "volume" | "mass";
  kind: "static" | "dynamic";
  /** Across the injector. */
  pressureKpa: number;
  referencePressureKpa: number;
  densityGPerMl: number;
  referenceDensityGPerMl: number;
};

/** How far from the reference pressure a dynamic reading may be taken to be brought to it, as a share. */
const dynamicReach = 0.03;

/**
 * Brings a flow to the reference density and, where that may be, to the reference pressure, as through a fixed orifice.
 *
 * Density: volume flow times √(ρ/ρref), mass flow times √(ρref/ρ). Pressure: times √(ΔPref/ΔP) for static flow and for the
 * slope of a flow line. A dynamic reading holds the dead time too, which does not follow the root (published tables show
 * it rising by 7 to 18 % from 250 to 500 kPa at 14 V): it is brought to the reference pressure only when taken within
 * ±3 % of it. Further away `withinRange` is false and only the density is corrected; such a reading stands at its own
 * pressure and is compared with none at another.
 *
 * Units: kPa, g/mL; the value in any flow or amount per pulse, from any kind of bench. Range: pressures and densities above 0.
 * Throws RangeError naming value, pressureKpa, referencePressureKpa, densityGPerMl or referenceDensityGPerMl.
 * Source: orifice flow at constant discharge coefficient; exponents 0.503 to 0.513 in the injector map of the Sloan
 * Automotive Laboratory's open code. The reach of 3 % is common practice, no source.
 */
export function correctFlow(
  value: number,
  correction: FlowCorrection,
): { value: number; factor: number; withinRange: boolean } {
  requireNumber("value", value);
  const { basis, kind } = correction;
  const density = ratioOf(correction, "densityGPerMl", "referenceDensityGPerMl");
  const pressure = ratioOf(correction, "referencePressureKpa", "pressureKpa");
  const withinRange = kind === "static" || Math.abs(1 / pressure - 1) <= dynamicReach + 1e-12;
  const byDensity = basis === "volume" ? Math.sqrt(density) : 1 / Math.sqrt(density);
  const factor = requireFinite(
    "pressureKpa, densityGPerMl",
    byDensity * (withinRange ? Math.sqrt(pressure) : 1),
  );
  return { value: requireFinite("value", value * factor), factor, withinRange };
}

type Measure = "pressureKpa" | "referencePressureKpa" | "densityGPerMl" | "referenceDensityGPerMl";

function ratioOf(correction: FlowCorrection, over: Measure, under: Measure): number {
  const upper = requireNumber(over, correction[over], { above: 0 });
  return requireFinite(`${over}, ${under}`, upper / requireNumber(under, correction[under], { above: 0 }));
}
