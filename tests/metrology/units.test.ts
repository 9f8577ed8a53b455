import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  barOfKpa,
  gPerSecondOfMlPerMin,
  kpaOfBar,
  kpaOfPsi,
  lbPerHourOfMlPerMin,
  mlPerMinOfGPerSecond,
  mlPerMinOfLbPerHour,
  psiOfKpa,
} from "@/metrology";
import { publishedCase } from "../support/published-case";
import { expectRelative } from "./support/expect-relative";
import { number, unusable } from "./support/numbers";

type Factors = { values: { id: string; factor: number }[] };
type Flows = { values: { lb_per_h: number; rho_g_cm3: number; cm3_per_min: number; g_per_s: number }[] };

const { values: factors } = publishedCase<Factors>("units", "factors-a");
const factor = (id: string) => factors.find((candidate) => candidate.id === id)!.factor;

describe("NIST SP 811", () => {
  test("pounds per square inch, bar", () => {
    expectRelative(kpaOfPsi(1), factor("psi_to_kPa"), 1e-15);
    expectRelative(psiOfKpa(factor("psi_to_kPa")), 1, 1e-15);
    expect(kpaOfBar(3)).toBe(300);
    expect(barOfKpa(300)).toBe(3);
  });

  test("pounds per hour", () => {
    const grams = gPerSecondOfMlPerMin(mlPerMinOfLbPerHour(1, 0.72), 0.72);
    expectRelative(grams, factor("lb-h_to_g-s"), 1e-15);
  });

  const { values } = publishedCase<Flows>("units", "flow-conversions-a");
  test.each(values)("$lb_per_h lb/h at $rho_g_cm3 g/mL: $cm3_per_min", ({ lb_per_h, rho_g_cm3, ...flow }) => {
    expectRelative(mlPerMinOfLbPerHour(lb_per_h, rho_g_cm3), flow.cm3_per_min, 1e-6);
    expectRelative(mlPerMinOfGPerSecond(flow.g_per_s, rho_g_cm3), flow.cm3_per_min, 1e-6);
    expectRelative(lbPerHourOfMlPerMin(flow.cm3_per_min, rho_g_cm3), lb_per_h, 1e-6);
  });
});

test("10.5 cc/min per lb/h holds only at 0.72 g/mL: n-heptane at 20 °C needs 11.06", () => {
  type Trade = { expected: { density_implied_g_cm3: number } };
  const { expected } = publishedCase<Trade>("units", "ten-point-five");
  expect(mlPerMinOfLbPerHour(1, expected.density_implied_g_cm3)).toBeCloseTo(10.5, 4);
  expect(mlPerMinOfLbPerHour(1, 0.683815).toFixed(2)).toBe("11.06");
});

test("there and back again", () =>
  fc.assert(
    fc.property(number(1, 3000), number(0.5, 1), (flow, density) => {
      expectRelative(mlPerMinOfLbPerHour(lbPerHourOfMlPerMin(flow, density), density), flow, 1e-14);
      expectRelative(mlPerMinOfGPerSecond(gPerSecondOfMlPerMin(flow, density), density), flow, 1e-14);
      expectRelative(kpaOfPsi(psiOfKpa(flow)), flow, 1e-14);
    }),
  ));

test.each(unusable)("refuses %s", (value) => {
  expect(() => kpaOfPsi(value)).toThrow(/psi must be a number/);
  expect(() => psiOfKpa(value)).toThrow(/kpa must be a number/);
  expect(() => kpaOfBar(value)).toThrow(/bar must be a number/);
  expect(() => barOfKpa(value)).toThrow(/kpa must be a number/);
  expect(() => mlPerMinOfLbPerHour(value, 0.7)).toThrow(/lbPerHour must be a number/);
  expect(() => mlPerMinOfGPerSecond(value, 0.7)).toThrow(/gPerSecond must be a number/);
  expect(() => gPerSecondOfMlPerMin(440, value)).toThrow(/densityGPerMl must be a number above 0/);
  expect(() => lbPerHourOfMlPerMin(440, 0)).toThrow(/densityGPerMl must be a number above 0/);
});
