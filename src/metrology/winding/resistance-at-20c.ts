import { requireFinite, requireNumber } from "../limits";

/** Minus the temperature at which copper's resistance would vanish, °C: printed with every resistance at 20 °C. */
export const copperConstantC = 234.5;

/**
 * Resistance of a copper winding at 20 °C: R20 = R · (234.5 + 20) / (234.5 + T), the lead resistance taken off before.
 *
 * A coil that was just pulsed is warmer than the room, 0.39 % per K. Other standards use 235, which differs by 0.007 % at
 * 30 °C; 234.5 belongs to a coefficient of 0.00393 per K at 20 °C.
 *
 * Units: Ω, °C. Range: resistance above 0, temperature −50 to 200 °C.
 * Throws RangeError naming ohms or temperatureC and its limits.
 * Source: IEC 60028:1925 (annealed copper), as IEEE practice writes it; factors of ASTM B193.
 */
export function resistanceAt20C(ohms: number, temperatureC: number): number {
  requireNumber("ohms", ohms, { above: 0 });
  requireNumber("temperatureC", temperatureC, { from: -50, upTo: 200 });
  return requireFinite("ohms", (ohms * (copperConstantC + 20)) / (copperConstantC + temperatureC));
}
