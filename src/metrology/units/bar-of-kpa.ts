import { requireNumber } from "../limits";
import { kilopascalsPerBar } from "./factors";

/**
 * Pressure in bar of a pressure in kPa: kPa / 100.
 *
 * Units: kPa in, bar out. Range: within ±1e100.
 * Throws RangeError naming kpa.
 * Source: NIST SP 811 (2008), Appendix B.
 */
export function barOfKpa(kpa: number): number {
  return requireNumber("kpa", kpa) / kilopascalsPerBar;
}
