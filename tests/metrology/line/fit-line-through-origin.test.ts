import { expect, test } from "vitest";
import { fitLineThroughOrigin } from "@/metrology";
import { publishedCase } from "../../support/published-case";
import { expectRelative } from "../support/expect-relative";

type Certified = { x: number[]; y: number[]; expected: Record<string, number> };

test("NIST StRD NoInt1, certified to 15 digits", () => {
  const { x, y, expected } = publishedCase<Certified>("regression", "nist-strd-noint1");
  const fit = fitLineThroughOrigin(x.map((value, i) => ({ x: value, y: y[i]! })));
  expectRelative(fit.slope, expected.slope!, 1e-13);
  expectRelative(fit.slopeSe, expected.sd_slope!, 1e-13);
  expectRelative(fit.residualSd, expected.residual_sd!, 1e-13);
  expectRelative(fit.rSquared, expected.r_squared_uncentred!, 1e-13);
  expect(fit).toMatchObject({ intercept: 0, interceptSe: 0, degreesOfFreedom: 10 });
});

test("one point gives a line that says nothing of its error", () =>
  expect(fitLineThroughOrigin([{ x: 2, y: 5 }])).toMatchObject({
    slope: 2.5,
    slopeSe: null,
    residualSd: null,
  }));

test("known uncertainties are taken as they are", () => {
  const fit = fitLineThroughOrigin([
    { x: 1, y: 2, u: 0.1 },
    { x: 2, y: 4.2, u: 0.2 },
  ]);
  expect(fit.slope).toBeCloseTo(2.05, 12);
  expect(fit.slopeSe).toBeCloseTo(1 / Math.sqrt(200), 12);
});

test("refuses what no line can go through", () => {
  expect(() => fitLineThroughOrigin([])).toThrow(/points must be at least 1/);
  expect(() => fitLineThroughOrigin([{ x: 0, y: 1 }])).toThrow(/one x at least that is not 0/);
  expect(() => fitLineThroughOrigin([{ x: 1, y: Number.NaN }])).toThrow(/points\[0\]\.y must be a number/);
});
