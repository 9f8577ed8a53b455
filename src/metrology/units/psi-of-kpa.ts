import { requireNumber } from "../limits";
import { kilopascalsPerPsi } from "./factors";

/**
 * Pressure in psi of a pressure in kPa: kPa / 6.894757293168361.
 *
 * Units: kPa in, psi out. Range: within ±1e100.
 * Throws RangeError naming kpa.
 * Source: NIST SP 811 (2008), Appendix B.
 */
export function psiOfKpa(kpa: number): number {
  return requireNumber("kpa", kpa) / kilopascalsPerPsi;
}
