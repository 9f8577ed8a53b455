import { requireNumber } from "../limits";

/**
 * Standard uncertainty of a reading from the division of its scale alone: division / √12, a rectangular distribution of
 * half a division either way.
 *
 * Units: those of the division. Range: from 0 up.
 * Throws RangeError naming division and its limit.
 * Source: JCGM 100:2008 (GUM), F.2.2.1.
 */
export function readingResolution(division: number): number {
  return requireNumber("division", division, { from: 0 }) / Math.sqrt(12);
}
