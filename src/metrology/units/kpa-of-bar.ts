import { requireNumber } from "../limits";
import { kilopascalsPerBar } from "./factors";

/**
 * Pressure in kPa of a pressure in bar: bar · 100.
 *
 * Units: bar in, kPa out. Range: within ±1e100.
 * Throws RangeError naming bar.
 * Source: NIST SP 811 (2008), Appendix B.
 */
export function kpaOfBar(bar: number): number {
  return requireNumber("bar", bar) * kilopascalsPerBar;
}
