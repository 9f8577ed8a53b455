import { describe, expect, test } from "vitest";
import { chiSquareQuantile, normalQuantile, tQuantile } from "@/metrology/uncertainty/quantiles";
import { tFactor } from "@/metrology/uncertainty/t-factor";
import { publishedCase } from "../../support/published-case";

type Students = { p: number; values: { df: number | "inf"; t: number; printed_2dp: number }[] };
type ChiSquares = { values: { df: number; chi2_upper_5: number; chi2_upper_95: number }[] };

describe.each(["t-factor-p90", "t-factor-p95", "t-factor-p95.45"])("JCGM 100:2008 Table G.2, %s", (id) => {
  const { p, values } = publishedCase<Students>("distributions", id);

  test.each(values)("$df degrees of freedom: $printed_2dp", ({ df, t, printed_2dp }) => {
    const factor = tFactor(p, typeof df === "number" ? df : Number.POSITIVE_INFINITY);
    expect(Math.abs(factor - t)).toBeLessThanOrEqual(6e-5);
    expect(Math.abs(factor - printed_2dp)).toBeLessThanOrEqual(0.0051);
  });
});

const { values } = publishedCase<ChiSquares>("distributions", "chi2-5pct");
test.each(values)(
  "NIST/SEMATECH e-Handbook 1.3.6.7.4: chi-square, $df",
  ({ df, chi2_upper_5, chi2_upper_95 }) => {
    expect(Math.abs(chiSquareQuantile(0.95, df) - chi2_upper_5)).toBeLessThanOrEqual(6e-4);
    expect(Math.abs(chiSquareQuantile(0.05, df) - chi2_upper_95)).toBeLessThanOrEqual(6e-4);
  },
);

test("normal, to ten digits (Abramowitz and Stegun 26.2.23 tables)", () => {
  expect(normalQuantile(0.975)).toBeCloseTo(1.959963984540054, 10);
  expect(normalQuantile(0.995)).toBeCloseTo(2.5758293035489, 10);
  expect(tQuantile(0.975, Number.POSITIVE_INFINITY)).toBe(normalQuantile(0.975));
});

test("one degree of freedom is Cauchy's: tan(π(p − ½))", () =>
  expect(tQuantile(0.99, 1)).toBeCloseTo(Math.tan(Math.PI * 0.49), 8));
