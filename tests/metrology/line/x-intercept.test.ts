import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { fitLine, xIntercept } from "@/metrology";
import { publishedCase } from "../../support/published-case";
import { expectRelative } from "../support/expect-relative";
import { number, points } from "../support/numbers";

type Crossing = {
  x: number[];
  y: number[];
  y0: number;
  confidence_level: number;
  expected: { x0: number; se_x0_delta: number; ci_fieller: [number, number] };
};

/** Where a line reaches y0 is where the line of y − y0 crosses zero. */
const crossingOf = ({ x, y, y0, confidence_level }: Crossing) =>
  xIntercept(fitLine(x.map((value, i) => ({ x: value, y: y[i]! - y0 }))), confidence_level);

describe("Fieller's interval and the standard error with the covariance", () => {
  test.each([
    ["Graybill and Iyer, crystal growth at 5 g", "graybill-crystal-y5-90"],
    ["Graybill and Iyer, crystal growth at 8 g", "graybill-crystal-y8-95"],
    ["Graybill and Iyer, arsenic at 3", "graybill-arsenic-y3-90-mean"],
    ["Miller and Miller, silver by standard addition", "miller-silver-standard-addition"],
  ])("%s", (_, id) => {
    const { expected, ...data } = publishedCase<Crossing>("x-intercept", id);
    const { value, standardError, interval } = crossingOf({ expected, ...data });
    expectRelative(value, expected.x0, 1e-9);
    expectRelative(standardError, expected.se_x0_delta, 1e-9);
    expectRelative(interval?.low, expected.ci_fieller[0], 1e-9);
    expectRelative(interval?.high, expected.ci_fieller[1], 1e-9);
  });

  test("rounds to what The R Journal 6 (2014) prints", () => {
    const crystal = crossingOf(publishedCase("x-intercept", "graybill-crystal-y5-90"));
    expect(crystal.value!.toFixed(2)).toBe("9.93");
    expect(crystal.standardError!.toFixed(7)).toBe("0.6658998");
    expect([crystal.interval!.low.toFixed(2), crystal.interval!.high.toFixed(2)]).toEqual(["8.65", "11.05"]);
  });
});

test("a slope that does not differ from zero has a crossing without an interval", () => {
  const flat = fitLine([1, -1, 1.2, -1.1, 0.9].map((y, x) => ({ x, y })));
  expect(xIntercept(flat)).toMatchObject({ interval: null, value: expect.any(Number) });
});

test("two points leave nothing to estimate from; a level line has no crossing", () => {
  const of = (...ys: number[]) => xIntercept(fitLine(ys.map((y, x) => ({ x, y }))));
  expect(of(-1, 1)).toEqual({ value: 0.5, standardError: null, interval: null });
  expect(of(2, 2, 2)).toEqual({ value: null, standardError: null, interval: null });
});

test.each([0, 1, -0.5, Number.NaN])("refuses a confidence of %s", (confidence) => {
  const fit = fitLine([0, 1, 2.1].map((y, x) => ({ x, y })));
  expect(() => xIntercept(fit, confidence)).toThrow(/confidence must be a number above 0 and below 1/);
});

describe("for whatever points", () => {
  test("the interval holds the crossing and widens with confidence", () =>
    fc.assert(
      fc.property(points, (list) => {
        const fit = fitLine(list);
        const [narrow, wide] = [xIntercept(fit, 0.5), xIntercept(fit, 0.95)];
        if (!narrow.interval || !wide.interval) return;
        const { low, high } = narrow.interval;
        const slack = 1e-9 * (1 + Math.abs(low) + Math.abs(high));
        expect(low).toBeLessThanOrEqual(narrow.value! + slack);
        expect(high).toBeGreaterThanOrEqual(narrow.value! - slack);
        expect(wide.interval.low).toBeLessThanOrEqual(low + slack);
        expect(wide.interval.high).toBeGreaterThanOrEqual(high - slack);
      }),
    ));

  test("another unit of y changes nothing", () =>
    fc.assert(
      fc.property(points, number(0.001, 1000), (list, scale) => {
        const plain = xIntercept(fitLine(list)).interval;
        const scaled = xIntercept(fitLine(list.map(({ x, y }) => ({ x, y: scale * y })))).interval;
        if (!plain || !scaled) return;
        expect(Math.abs(scaled.low - plain.low)).toBeLessThanOrEqual(1e-6 * (1 + Math.abs(plain.low)));
      }),
    ));
});
