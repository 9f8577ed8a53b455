import { requireFinite, requireNumber } from "../limits";

/**
 * Duty in percent: 100 · pulse width / period. At 100 % the injector never closes and the reading is static.
 *
 * Units: ms. Range: both above 0.
 * Throws RangeError naming pulseWidthMs or periodMs.
 * Source: definition.
 */
export function dutyPercent(pulseWidthMs: number, periodMs: number): number {
  requireNumber("pulseWidthMs", pulseWidthMs, { above: 0 });
  requireNumber("periodMs", periodMs, { above: 0 });
  return requireFinite("pulseWidthMs, periodMs", (100 * pulseWidthMs) / periodMs);
}
