import { requireNumber } from "../limits";

export type Verdict = "pass" | "conditional pass" | "conditional fail" | "fail";

/**
 * Verdict on a measured value against one or two limits, with a guard band as wide as its expanded uncertainty (w = U).
 *
 * Pass: within the limits by U at least. Conditional pass: within them. Conditional fail: outside by U at most. Fail:
 * further out. A value on a boundary gets the better of the two words; boundaries are compared with a slack of 1e-12 of the
 * numbers, so that decimals typed by people land where decimal arithmetic puts them.
 *
 * Units: value, limits and uncertainty alike. Range: at least one limit, low not above high, U from 0 up.
 * Throws RangeError for no limit, limits in the wrong order, or numbers out of range.
 * Source: ILAC-G8:09/2019, non-binary statement with guard band w = U; at most 2.5 % specific risk of a wrong pass at one
 * limit (U = 2u).
 */
export function decide(
  value: number,
  { low, high }: { low?: number; high?: number },
  expandedUncertainty: number,
): Verdict {
  requireNumber("value", value);
  requireNumber("expandedUncertainty", expandedUncertainty, { from: 0 });
  if (low === undefined && high === undefined)
    throw new RangeError("limits must hold low or high: none was given");
  if (low !== undefined) requireNumber("low", low);
  if (high !== undefined) requireNumber("high", high, { from: low });
  const slack =
    1e-12 * Math.max(Math.abs(value), Math.abs(low ?? 0), Math.abs(high ?? 0), expandedUncertainty);
  const inside = Math.min(
    low === undefined ? Number.POSITIVE_INFINITY : value - low,
    high === undefined ? Number.POSITIVE_INFINITY : high - value,
  );
  if (inside >= expandedUncertainty - slack) return "pass";
  if (inside >= -slack) return "conditional pass";
  return inside >= -expandedUncertainty - slack ? "conditional fail" : "fail";
}
