import { requireNumber } from "../limits";
import { kilopascalsPerPsi } from "./factors";

/**
 * Pressure in kPa of a pressure in psi: psi · 6.894757293168361.
 *
 * Units: psi in, kPa out. Range: within ±1e100.
 * Throws RangeError naming psi.
 * Source: NIST SP 811 (2008), Appendix B.
 */
export function kpaOfPsi(psi: number): number {
  return requireNumber("psi", psi) * kilopascalsPerPsi;
}
