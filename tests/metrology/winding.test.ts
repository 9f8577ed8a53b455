import fc from "fast-check";
import { expect, test } from "vitest";
import { resistanceAt20C } from "@/metrology";
import { publishedCase } from "../support/published-case";
import { expectRelative } from "./support/expect-relative";
import { number, unusable } from "./support/numbers";

type Factors = { values: { t_C: number; factor_printed: number }[] };
const { values } = publishedCase<Factors>("winding", "b193-factors-a");

test.each(values)("ASTM B193 at $t_C °C: $factor_printed", ({ t_C, factor_printed }) =>
  expect(Math.abs(resistanceAt20C(1, t_C) - factor_printed)).toBeLessThanOrEqual(7e-5),
);

test("NEC Table 8: 1.98 Ω at 75 °C are 1.692 Ω at 30 °C", () => {
  type Wire = { inputs: { R75_ohm_per_kft: number; t_C: number }; expected: { R30_ohm_per_kft: number } };
  const { inputs, expected } = publishedCase<Wire>("winding", "nec-table-8");
  const at20 = resistanceAt20C(inputs.R75_ohm_per_kft, 75);
  expect(Math.abs(at20 / resistanceAt20C(1, inputs.t_C) - expected.R30_ohm_per_kft)).toBeLessThan(0.002);
});

test("0.39 % per kelvin near 20 °C (IEC 60028)", () => {
  type Copper = { alpha20_per_K: number };
  const { alpha20_per_K } = publishedCase<Copper>("winding", "copper-constants");
  expectRelative(1 / resistanceAt20C(1, 21) - 1, alpha20_per_K, 1e-3);
  expect(resistanceAt20C(14.5, 20)).toBe(14.5);
});

test("is proportional to the resistance and falls as the coil was warmer", () =>
  fc.assert(
    fc.property(number(0.5, 20), number(-40, 150), number(0.1, 40), (ohms, temperature, warmer) => {
      expectRelative(resistanceAt20C(2 * ohms, temperature), 2 * resistanceAt20C(ohms, temperature), 1e-14);
      expect(resistanceAt20C(ohms, temperature + warmer)).toBeLessThan(resistanceAt20C(ohms, temperature));
    }),
  ));

test("refuses what is no winding", () => {
  expect(() => resistanceAt20C(0, 20)).toThrow(/ohms must be a number above 0/);
  expect(() => resistanceAt20C(12, 201)).toThrow(/temperatureC must be a number from -50 and up to 200: 201/);
  for (const value of unusable) expect(() => resistanceAt20C(value, 20)).toThrow(RangeError);
});
