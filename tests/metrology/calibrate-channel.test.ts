import { describe, expect, test } from "vitest";
import { calibrateChannel } from "@/metrology";
import { publishedCase } from "../support/published-case";
import { expectRelative } from "./support/expect-relative";

type Thermometer = { x_C: number[]; y_C: number[]; x_reference_C: number; expected: Record<string, number> };

describe("GUM H.3, calibration of a thermometer", () => {
  const { x_C, y_C, x_reference_C, expected } = publishedCase<Thermometer>("gum", "gum-h3-thermometer");
  /** Its corrections as true values: true = indicated + correction, from the reference temperature on. */
  const fit = calibrateChannel(
    x_C.map((x, i) => ({ indicatedMl: x - x_reference_C, trueMl: x - x_reference_C + y_C[i]! })),
  );

  test("gain and offset with their uncertainties", () => {
    expectRelative(fit.gain, 1 + expected.slope!, 1e-12);
    expectRelative(fit.offset, expected.intercept!, 1e-9);
    expectRelative(fit.gainU, expected.sd_slope!, 1e-9);
    expectRelative(fit.offsetU, expected.sd_intercept!, 1e-9);
    expectRelative(fit.residualSd, expected.residual_sd!, 1e-9);
  });

  test("the uncertainty of one corrected reading joins scatter and line at the worse end", () => {
    const { sd_intercept, sd_slope, corr, residual_sd } = expected as Record<string, number>;
    const ofLine = (x: number) =>
      sd_intercept! ** 2 + (x * sd_slope!) ** 2 + 2 * x * corr! * sd_intercept! * sd_slope!;
    const ends = [Math.min(...x_C), Math.max(...x_C)].map((x) => ofLine(x - x_reference_C));
    expectRelative(fit.standardUncertainty, Math.sqrt(residual_sd! ** 2 + Math.max(...ends)), 1e-8);
  });
});

test("a cylinder that shows a little much: error before, none after", () => {
  const fit = calibrateChannel(
    [10, 50, 100].map((read) => ({ indicatedMl: read, trueMl: 0.998 * read + 0.05 })),
  );
  expectRelative(fit.gain, 0.998, 1e-12);
  expectRelative(fit.offset, 0.05, 1e-10);
  expect(fit.maxErrorMl).toBeCloseTo(0.15, 10);
  expect(fit.standardUncertainty).toBeLessThan(1e-10);
});

test("two points leave the uncertainties open", () =>
  expect(
    calibrateChannel([
      { indicatedMl: 10, trueMl: 10.1 },
      { indicatedMl: 90, trueMl: 90.1 },
    ]),
  ).toMatchObject({ gainU: null, offsetU: null, residualSd: null, standardUncertainty: null }));

test("refuses what is no calibration", () => {
  const point = { indicatedMl: 10, trueMl: 10 };
  expect(() => calibrateChannel([point])).toThrow(/points must be at least 2/);
  expect(() => calibrateChannel([point, point])).toThrow(/two different x/);
  expect(() => calibrateChannel([point, { indicatedMl: 20, trueMl: Number.NaN }])).toThrow(
    /points\[1\]\.trueMl must be a number/,
  );
});
