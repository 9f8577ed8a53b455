/**
 * One decimal convention per quantity, wherever it is written: page, certificate, data sheet. `trim` drops trailing
 * zeros, for what was set rather than measured.
 */
export type QuantityFormat = { unit: string; decimals: number; trim?: boolean };

export const quantities = {
  pulseWidth: { unit: "ms", decimals: 3, trim: true },
  period: { unit: "ms", decimals: 3, trim: true },
  pulseCount: { unit: "", decimals: 0 },
  openTime: { unit: "s", decimals: 2, trim: true },
  flowPerPulse: { unit: "µL", decimals: 2 },
  staticFlow: { unit: "mL/min", decimals: 1 },
  slope: { unit: "µL/ms", decimals: 4 },
  deadTime: { unit: "ms", decimals: 3 },
  adder: { unit: "ms", decimals: 3 },
  spread: { unit: "%", decimals: 2 },
  deviation: { unit: "%", decimals: 2 },
  closure: { unit: "%", decimals: 2 },
  duty: { unit: "%", decimals: 1 },
  tolerance: { unit: "%", decimals: 2, trim: true },
  ratio: { unit: "", decimals: 2 },
  resistance: { unit: "Ω", decimals: 2 },
  insulation: { unit: "MΩ", decimals: 1 },
  inductance: { unit: "mH", decimals: 2 },
  temperature: { unit: "°C", decimals: 1 },
  pressure: { unit: "kPa", decimals: 1 },
  voltage: { unit: "V", decimals: 2 },
  leakage: { unit: "mm³/min", decimals: 1 },
  density: { unit: "g/mL", decimals: 4 },
  collectedVolume: { unit: "mL", decimals: 2 },
  collectedMass: { unit: "g", decimals: 3 },
  gain: { unit: "", decimals: 5 },
  coverageFactor: { unit: "", decimals: 2 },
  minutes: { unit: "min", decimals: 0 },
} as const satisfies Record<string, QuantityFormat>;

export type Quantity = keyof typeof quantities;

export function unitOf(quantity: Quantity): string {
  return quantities[quantity].unit;
}
