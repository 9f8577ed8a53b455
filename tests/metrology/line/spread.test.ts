import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { spread } from "@/metrology";
import { meanAndSd } from "@/metrology/line/mean-and-sd";
import { publishedCase } from "../../support/published-case";
import { expectRelative } from "../support/expect-relative";
import { number, unusable } from "../support/numbers";

test("100 · (max − min) / mean, worked by hand", () =>
  expect(spread([438, 440, 442, 444])).toEqual({
    count: 4,
    mean: 441,
    min: 438,
    max: 444,
    range: 6,
    spreadPercent: 600 / 441,
    deviationsPercent: [-300 / 441, -100 / 441, 100 / 441, 300 / 441],
    maxDeviationPercent: 300 / 441,
    cvPercent: (100 * Math.sqrt(20 / 3)) / 441,
  }));

describe("NIST StRD, mean and standard deviation of numbers that hardly differ", () => {
  type Certified = { expected: { mean: number; sd: number } };

  test("NumAcc1", () => {
    const { x, expected } = publishedCase<Certified & { x: number[] }>("regression", "nist-strd-numacc1");
    expect(meanAndSd(x)).toEqual(expected);
  });

  test("NumAcc3, 1001 values", () => {
    const { expected } = publishedCase<Certified>("regression", "nist-strd-numacc3");
    const pairs = Array.from({ length: 1000 }, (_, i) => (i % 2 === 0 ? 1000000.1 : 1000000.3));
    const { mean, sd } = meanAndSd([1000000.2, ...pairs]);
    expectRelative(mean, expected.mean, 1e-15);
    expectRelative(sd, expected.sd, 1e-9);
  });
});

const flows = fc.array(number(100, 900), { minLength: 2, maxLength: 32 });

test("no unit and no order changes it; deviations sum to nothing", () =>
  fc.assert(
    fc.property(flows, number(0.01, 100), (values, scale) => {
      const plain = spread(values);
      const scaled = spread([...values].reverse().map((value) => scale * value));
      expect(scaled.spreadPercent).toBeCloseTo(plain.spreadPercent, 9);
      expect(scaled.cvPercent).toBeCloseTo(plain.cvPercent, 9);
      expect(plain.deviationsPercent.reduce((sum, value) => sum + value, 0)).toBeCloseTo(0, 9);
      expect(plain.spreadPercent).toBeGreaterThanOrEqual(plain.maxDeviationPercent - 1e-9);
    }),
  ));

test("refuses what has no spread", () => {
  expect(() => spread([440])).toThrow(/values must be at least 2: 1 were given/);
  expect(() => spread([1, -1])).toThrow(/values must have a mean other than 0/);
  for (const value of unusable) expect(() => spread([440, value])).toThrow(/values\[1\] must be a number/);
});
