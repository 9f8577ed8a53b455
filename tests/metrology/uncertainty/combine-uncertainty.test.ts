import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { combineUncertainty } from "@/metrology";
import { publishedCase } from "../../support/published-case";
import { expectRelative } from "../support/expect-relative";
import { number } from "../support/numbers";

describe("GUM H.1, calibration of an end gauge", () => {
  type Gauge = { expected: Record<string, number> };
  const { expected } = publishedCase<Gauge>("gum", "gum-h1-end-gauge");
  const comparator = combineUncertainty([
    { name: "mean of five", standardUncertainty: 5.8, degreesOfFreedom: 24 },
    { name: "comparator, random", standardUncertainty: 3.9, degreesOfFreedom: 5 },
    { name: "comparator, systematic", standardUncertainty: 6.7, degreesOfFreedom: 8 },
  ]);

  test("the comparison has 9.7 nm and 25 degrees of freedom", () => {
    expectRelative(comparator.standardUncertainty, expected.u_d!, 1e-6);
    expect(comparator.effectiveDegreesOfFreedom).toBe(Math.floor(expected.dof_d!));
  });

  test("the length has 32 nm, 16 degrees of freedom, t = 2.92 and 93 nm at 99 %", () => {
    const { standardUncertainty, effectiveDegreesOfFreedom, coverageFactor, expandedUncertainty } =
      combineUncertainty(
        [
          { name: "standard", standardUncertainty: 25, degreesOfFreedom: 18 },
          { name: "comparison", standardUncertainty: expected.u_d!, degreesOfFreedom: expected.dof_d! },
          {
            name: "difference of expansion",
            standardUncertainty: 1e-6 / Math.sqrt(3),
            sensitivity: 50000623 * 0.1,
            degreesOfFreedom: 50,
          },
          {
            name: "difference of temperature",
            standardUncertainty: 0.05 / Math.sqrt(3),
            sensitivity: 50000623 * 11.5e-6,
            degreesOfFreedom: 2,
          },
        ],
        0.99,
      );
    expectRelative(standardUncertainty, expected.u_c_nm!, 1e-5);
    expect(effectiveDegreesOfFreedom).toBe(16);
    expect(coverageFactor).toBeCloseTo(expected.t99_dof16!, 4);
    expectRelative(expandedUncertainty, expected.U99_nm!, 1e-4);
  });
});

test("EURACHEM QUAM A1: 0.835 mg/L", () => {
  type Budget = { expected: { u: number } };
  const { expected } = publishedCase<Budget>("gum", "eurachem-a1-budget");
  const volume = Math.hypot(0.1 / Math.sqrt(6), 0.02, 0.084 / Math.sqrt(3));
  const { standardUncertainty } = combineUncertainty([
    { name: "mass", standardUncertainty: 0.05, sensitivity: (1000 * 0.9999) / 100 },
    { name: "purity", standardUncertainty: 0.0001 / Math.sqrt(3), sensitivity: (1000 * 100.28) / 100 },
    { name: "volume", standardUncertainty: volume, sensitivity: (-1000 * 100.28 * 0.9999) / 100 ** 2 },
  ]);
  expectRelative(standardUncertainty, expected.u, 1e-5);
});

test("infinite degrees of freedom give the normal factor", () => {
  const parts = [{ name: "division", standardUncertainty: 0.0577 }];
  expect(combineUncertainty(parts)).toMatchObject({ effectiveDegreesOfFreedom: Number.POSITIVE_INFINITY });
  expect(combineUncertainty(parts).coverageFactor).toBeCloseTo(1.959964, 6);
  expect(combineUncertainty(parts, 0.9545).coverageFactor).toBeCloseTo(2, 4);
});

test("a budget of nothing is nothing", () =>
  expect(
    combineUncertainty([{ name: "none", standardUncertainty: 0, degreesOfFreedom: 3 }]).expandedUncertainty,
  ).toBe(0));

test.each([
  [[], 0.95, /components must be at least 1/],
  [
    [{ name: "scale", standardUncertainty: -1 }],
    0.95,
    /standardUncertainty of scale must be a number from 0/,
  ],
  [[{ name: "scale", standardUncertainty: 1, sensitivity: Number.NaN }], 0.95, /sensitivity of scale/],
  [
    [{ name: "scale", standardUncertainty: 1, degreesOfFreedom: 0 }],
    0.95,
    /degreesOfFreedom of scale .* from 1/,
  ],
  [[{ name: "scale", standardUncertainty: 1 }], 1.2, /confidence must be a number above 0 and below 1/],
])("refuses %j at %s", (parts, confidence, message) =>
  expect(() => combineUncertainty(parts, confidence)).toThrow(message),
);

const components = fc.array(
  fc.record({
    name: fc.constant("part"),
    standardUncertainty: number(0, 10),
    degreesOfFreedom: fc.integer({ min: 1, max: 60 }),
  }),
  { minLength: 1, maxLength: 8 },
);

test("effective degrees of freedom lie between the fewest and the sum; order and unit change nothing", () =>
  fc.assert(
    fc.property(components, number(0.01, 100), (parts, scale) => {
      fc.pre(parts.some(({ standardUncertainty }) => standardUncertainty > 1e-3));
      const whole = combineUncertainty(parts);
      const counting = parts.filter(({ standardUncertainty }) => standardUncertainty > 0);
      const all = counting.map(({ degreesOfFreedom }) => degreesOfFreedom);
      expect(whole.effectiveDegreesOfFreedom).toBeGreaterThanOrEqual(Math.min(...all));
      expect(whole.effectiveDegreesOfFreedom).toBeLessThanOrEqual(all.reduce((sum, dof) => sum + dof, 0));
      const scaled = combineUncertainty(
        [...parts].reverse().map((part) => ({ ...part, sensitivity: -scale })),
      );
      expectRelative(scaled.standardUncertainty, scale * whole.standardUncertainty, 1e-12);
      expect(scaled.effectiveDegreesOfFreedom).toBe(whole.effectiveDegreesOfFreedom);
    }),
  ));
