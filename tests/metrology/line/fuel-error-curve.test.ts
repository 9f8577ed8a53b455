import { expect, test } from "vitest";
import { fuelErrorCurve } from "@/metrology";

const lines = [
  { slopeUlPerMs: 7, deadTimeMs: 0.9 },
  { slopeUlPerMs: 7, deadTimeMs: 0.94 },
];

test("a mismatch of dead times hardly shows at 10 ms and dominates at idle, worked by hand", () => {
  const [idle, wide] = fuelErrorCurve(lines, [2.5, 10]);
  expect(idle!.meanUl).toBeCloseTo(7 * 1.58, 12);
  expect(idle!.errorsPercent[0]).toBeCloseTo(100 * (0.02 / 1.58), 10);
  expect(wide!.errorsPercent[0]).toBeCloseTo(100 * (0.02 / 9.08), 10);
});

test("errors of a set sum to nothing; equal injectors have none", () => {
  const { errorsPercent } = fuelErrorCurve([...lines, { slopeUlPerMs: 7.2, deadTimeMs: 0.85 }], [3])[0]!;
  expect(errorsPercent.reduce((sum, error) => sum + error, 0)).toBeCloseTo(0, 10);
  expect(fuelErrorCurve([lines[0]!, lines[0]!], [3])[0]!.errorsPercent).toEqual([0, 0]);
});

test("an injector delivers nothing at or below its dead time", () =>
  expect(fuelErrorCurve(lines, [0.92])[0]!.errorsPercent).toEqual([100, -100]));

test.each([
  [[], [3], /flowLines must be at least 1/],
  [[{ slopeUlPerMs: 0, deadTimeMs: 1 }], [3], /flowLines\[0\]\.slopeUlPerMs must be a number above 0/],
  [lines, [0], /widthsMs\[0\] must be a number above 0/],
  [lines, [0.5], /widthsMs\[0\] must be above the shortest dead time: 0.5 was given/],
])("refuses %j at %j", (given, widths, message) =>
  expect(() => fuelErrorCurve(given, widths)).toThrow(message),
);
