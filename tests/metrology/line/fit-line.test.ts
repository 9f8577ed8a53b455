import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { fitLine } from "@/metrology";
import { publishedCase } from "../../support/published-case";
import { expectRelative } from "../support/expect-relative";
import { number, points, unusable } from "../support/numbers";

type Data = { x: number[]; y: number[] };
type Line = { slope: number; intercept: number; sd_slope: number; sd_intercept: number };
type Certified = Data & { expected: Line & { residual_sd: number; r_squared: number; df_residual?: number } };

const pointsOf = ({ x, y }: Data) => x.map((value, i) => ({ x: value, y: y[i]! }));

describe("NIST StRD Norris, certified to 15 digits", () => {
  const norris = publishedCase<Certified>("regression", "nist-strd-norris");
  const fit = fitLine(pointsOf(norris));

  test.each([
    ["slope", fit.slope, norris.expected.slope, 1e-14],
    ["intercept", fit.intercept, norris.expected.intercept, 1e-12],
    ["slopeSe", fit.slopeSe, norris.expected.sd_slope, 1e-12],
    ["interceptSe", fit.interceptSe, norris.expected.sd_intercept, 1e-12],
    ["residualSd", fit.residualSd, norris.expected.residual_sd, 1e-12],
    ["rSquared", fit.rSquared, norris.expected.r_squared, 1e-14],
  ])("%s", (_, actual, certified, tolerance) => expectRelative(actual, certified, tolerance));

  test("degrees of freedom are points less 2", () => expect(fit.degreesOfFreedom).toBe(34));

  test("holds 10 digits far away from the origin too", () => {
    const far = fitLine(pointsOf(norris).map(({ x, y }) => ({ x: x + 1e6, y: y + 1e6 })));
    expectRelative(far.slope, norris.expected.slope, 1e-10);
    expectRelative(far.residualSd, norris.expected.residual_sd, 1e-7);
  });
});

test.each(["anscombe-I", "anscombe-III"])("Anscombe 1973: %s", (id) => {
  const { expected, ...data } = publishedCase<Certified>("regression", id);
  const fit = fitLine(pointsOf(data));
  expectRelative(fit.slope, expected.slope, 1e-10);
  expectRelative(fit.intercept, expected.intercept, 1e-10);
  expectRelative(fit.slopeSe, expected.sd_slope, 1e-10);
  expectRelative(fit.interceptSe, expected.sd_intercept, 1e-10);
});

describe("with known uncertainties", () => {
  test("ISO/TS 28037:2010, weighted example: standard errors follow from the uncertainties alone", () => {
    type Weighted = Data & { u_y: number[]; expected: Record<string, number> };
    const { expected, u_y, ...data } = publishedCase<Weighted>("x-intercept", "iso28037-wls1");
    const fit = fitLine(pointsOf(data).map((point, i) => ({ ...point, u: u_y[i]! })));
    expectRelative(fit.slope, expected.slope!, 1e-10);
    expectRelative(fit.intercept, expected.intercept!, 1e-10);
    expectRelative(fit.slopeSe, expected.u_slope!, 1e-10);
    expectRelative(fit.interceptSe, expected.u_intercept!, 1e-10);
    expectRelative(fit.covariance, expected.cov!, 1e-10);
    expectRelative(fit.residualSd! ** 2 * fit.degreesOfFreedom, expected.chi_squared_observed!, 1e-10);
  });

  test("unequal ones, against R: unscaled, and scaled by residualSd", () => {
    type Compared = Data & { u_y: number[]; expected: Record<string, number> };
    const { expected, u_y, ...data } = publishedCase<Compared>("weighted-line", "scaled-vs-unscaled-weights");
    const fit = fitLine(pointsOf(data).map((point, i) => ({ ...point, u: u_y[i]! })));
    expectRelative(fit.slope, expected.slope!, 1e-10);
    expectRelative(fit.interceptSe, expected.u_intercept_unscaled!, 1e-10);
    expectRelative(fit.covariance, expected.cov_unscaled!, 1e-10);
    expectRelative(fit.slopeSe! * fit.residualSd!, expected.u_slope_scaled!, 1e-10);
    expectRelative(fit.interceptSe! * fit.residualSd!, expected.u_intercept_scaled!, 1e-10);
  });

  test("Miller and Miller: weights move the intercept", () => {
    type Weighted = Data & { sd_y: number[]; expected: Record<string, number> };
    const { expected, sd_y, ...data } = publishedCase<Weighted>("weighted-line", "miller-weighted-line");
    const fit = fitLine(pointsOf(data).map((point, i) => ({ ...point, u: sd_y[i]! })));
    expectRelative(fit.slope, expected.slope!, 1e-10);
    expectRelative(fit.intercept, expected.intercept!, 1e-10);
  });
});

test("two points give a line that says nothing of its error", () => {
  const { slope, intercept, ...errors } = fitLine([
    { x: 1, y: 3 },
    { x: 2, y: 5 },
  ]);
  expect({ slope, intercept }).toEqual({ slope: 2, intercept: 1 });
  expect(errors).toEqual({
    slopeSe: null,
    interceptSe: null,
    covariance: null,
    residualSd: null,
    rSquared: 1,
    degreesOfFreedom: 0,
  });
});

describe("refuses, naming what is wrong and the limit", () => {
  const good = [
    { x: 1, y: 1 },
    { x: 2, y: 2 },
  ];
  test.each([
    ["one point", [good[0]!], /^points must be at least 2: 1 were given$/],
    ["x all alike", [good[0]!, { x: 1, y: 5 }], /points must have two different x/],
    ["u for some", [{ ...good[0]!, u: 1 }, good[1]!], /points must have u for all or for none: 1 of 2/],
    ["u of 0", good.map((point) => ({ ...point, u: 0 })), /points\[0\]\.u must be a number above 0/],
  ])("%s", (_, given, message) => expect(() => fitLine(given)).toThrow(message));

  test.each(unusable)("%s", (value) => {
    expect(() => fitLine([...good, { x: value, y: 3 }])).toThrow(
      /points\[2\]\.x must be a number from -1e\+100/,
    );
    expect(() => fitLine([...good, { x: 3, y: value }])).toThrow(RangeError);
  });
});

describe("for whatever points", () => {
  test("their order does not matter", () =>
    fc.assert(
      fc.property(points, (list) => {
        const [fit, reversed] = [fitLine(list), fitLine([...list].reverse())];
        expect(reversed.slope).toBeCloseTo(fit.slope, 8);
        expect(reversed.residualSd).toBeCloseTo(fit.residualSd!, 8);
      }),
    ));

  test("another unit of y scales slope and errors; a shift of x moves the intercept alone", () =>
    fc.assert(
      fc.property(points, number(0.01, 100), number(-10, 10), (list, scale, shift) => {
        const fit = fitLine(list);
        const scaled = fitLine(list.map(({ x, y }) => ({ x, y: scale * y })));
        const tolerance = 1e-9 * (Math.abs(scaled.slope) + scaled.slopeSe! + 1);
        expect(Math.abs(scaled.slope - scale * fit.slope)).toBeLessThanOrEqual(tolerance);
        expect(Math.abs(scaled.slopeSe! - scale * fit.slopeSe!)).toBeLessThanOrEqual(tolerance);
        const moved = fitLine(list.map(({ x, y }) => ({ x: x + shift, y })));
        expect(moved.slope).toBeCloseTo(fit.slope, 6);
        expect(moved.intercept + moved.slope * shift).toBeCloseTo(fit.intercept, 4);
      }),
    ));

  test("every figure is a finite number", () =>
    fc.assert(
      fc.property(points, (list) => {
        for (const figure of Object.values(fitLine(list))) expect(Number.isFinite(figure)).toBe(true);
      }),
    ));
});
