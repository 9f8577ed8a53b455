import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { grubbs } from "@/metrology";
import { publishedCase } from "../../support/published-case";
import { number, unusable } from "../support/numbers";

type Table = { critical: { n: number; printed: number; computed: number }[]; tolerance_absolute: number };
type Worked = { data: number[]; expected: { G: number; suspect: number; critical_two_sided: number } };

const { critical } = publishedCase<Table>("grubbs", "grubbs-two-sided-5");

test.each(critical)("ISO 5725-2 Table 5: $n values, $printed", ({ n, printed, computed }) => {
  const found = grubbs(Array.from({ length: n }, (_, i) => i)).critical;
  expect(Math.abs(found - printed)).toBeLessThanOrEqual(0.0016);
  expect(Math.abs(found - computed)).toBeLessThanOrEqual(1e-5);
});

test.each([
  ["NIST/SEMATECH e-Handbook 1.3.5.17.1, uranium", "nist-grubbs-uranium"],
  ["ASTM E178, semi-diameters of Venus", "astm-e178-venus"],
])("%s", (_, id) => {
  const { data, expected } = publishedCase<Worked>("grubbs", id);
  const { statistic, critical, index, isOutlier } = grubbs(data);
  expect(statistic).toBeCloseTo(expected.G, 6);
  expect(critical).toBeCloseTo(expected.critical_two_sided, 4);
  expect(data[index]).toBe(expected.suspect);
  expect(isOutlier).toBe(true);
});

describe("its limits", () => {
  test("the largest G of four values is 1.5: almost no power", () =>
    fc.assert(
      fc.property(fc.array(number(-10, 10), { minLength: 4, maxLength: 4 }), (values) => {
        expect(grubbs(values).statistic).toBeLessThanOrEqual(1.5 + 1e-9);
      }),
    ));

  test("values all alike hold no outlier", () =>
    expect(grubbs([3, 3, 3, 3])).toMatchObject({ statistic: 0, isOutlier: false }));

  test("refuses two values, alpha out of range, no numbers", () => {
    expect(() => grubbs([1, 2])).toThrow(/values must be at least 3: 2 were given/);
    expect(() => grubbs([1, 2, 3], 0)).toThrow(/alpha must be a number above 0 and below 1/);
    for (const value of unusable) expect(() => grubbs([1, 2, value])).toThrow(/values\[2\] must be a number/);
  });
});

test("scale, shift and order change nothing", () =>
  fc.assert(
    fc.property(
      fc
        .array(number(0, 100), { minLength: 3, maxLength: 12 })
        .filter((v) => Math.max(...v) - Math.min(...v) > 1),
      number(0.1, 10),
      number(-100, 100),
      (values, scale, shift) => {
        const moved = grubbs(values.map((value) => scale * value + shift).reverse());
        expect(moved.statistic).toBeCloseTo(grubbs(values).statistic, 6);
      },
    ),
  ));
