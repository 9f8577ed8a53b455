import { requireFinite, requireNumber } from "../limits";

/**
 * Volume per pulse in µL of a true volume collected over a number of pulses: 1000 · mL / N.
 *
 * Units: mL, pulses. Range: volume within ±1e100 (a calibration's offset can take it below 0), at least 1 pulse.
 * Throws RangeError naming volumeMl or pulseCount.
 * Source: definition.
 */
export function volumePerPulseUl(volumeMl: number, pulseCount: number): number {
  requireNumber("volumeMl", volumeMl);
  requireNumber("pulseCount", pulseCount, { from: 1 });
  return requireFinite("volumeMl", (1000 * volumeMl) / pulseCount);
}
