import { describe, expect, test } from "vitest";
import { spread, spreadInterval } from "@/metrology";

const flows = [438, 440.5, 441, 444];

test("the same seed gives the same interval, another seed nearly the same", () => {
  const first = spreadInterval(flows, 0.6, { seed: 7 });
  expect(spreadInterval(flows, 0.6, { seed: 7 })).toEqual(first);
  const other = spreadInterval(flows, 0.6, { seed: 8 });
  expect(other).not.toEqual(first);
  expect(Math.abs(other.low - first.low)).toBeLessThan(0.03);
  expect(Math.abs(other.high - first.high)).toBeLessThan(0.03);
});

test("without uncertainty it is the spread itself", () => {
  const { spreadPercent } = spread(flows);
  const { low, high } = spreadInterval(flows, 0);
  expect(low).toBeCloseTo(spreadPercent, 10);
  expect(high).toBeCloseTo(spreadPercent, 10);
});

test("of two values far apart it is the interval of their difference", () => {
  const [u, a, b] = [0.5, 400, 460];
  const { low, high } = spreadInterval([a, b], u, { draws: 200_000, seed: 3 });
  const { spreadPercent, mean } = spread([a, b]);
  const half = (1.959964 * 100 * Math.SQRT2 * u) / mean;
  expect((high - low) / 2 / half).toBeCloseTo(1, 2);
  expect((high + low) / 2 - spreadPercent).toBeCloseTo(0, 2);
});

test("of four equal values it is that of the range of four normal draws: 0.59 and 3.98 standard deviations (H. L. Harter 1960)", () => {
  const { low, high } = spreadInterval([1000, 1000, 1000, 1000], 1, { draws: 200_000 });
  expect(high).toBeCloseTo(0.398, 2);
  expect(low).toBeCloseTo(0.059, 2);
});

describe("grows", () => {
  const width = (...[values, u, options]: Parameters<typeof spreadInterval>) => {
    const { low, high } = spreadInterval(values, u, options);
    return high - low;
  };

  test("with each uncertainty", () =>
    expect(width(flows, [0.6, 0.6, 0.6, 1.5])).toBeGreaterThan(width(flows, 0.6)));
  test("with the confidence", () =>
    expect(width(flows, 0.6, { confidence: 0.99 })).toBeGreaterThan(width(flows, 0.6)));
});

test("a factor that all share changes nothing", () => {
  const plain = spreadInterval(flows, 0.6);
  const shared = spreadInterval(
    flows.map((flow) => flow * 1.02),
    0.6 * 1.02,
  );
  expect(shared.low).toBeCloseTo(plain.low, 9);
  expect(shared.high).toBeCloseTo(plain.high, 9);
});

test.each([
  [[440], 1, {}, /values must be at least 2/],
  [flows, -1, {}, /u\[0\] must be a number from 0/],
  [flows, [1, 2], {}, /u must be one number or one for each of 4 values: 2 were given/],
  [flows, 1, { confidence: 1 }, /confidence must be a number above 0 and below 1/],
  [flows, 1, { draws: 10 }, /draws must be a number from 100 and up to 1000000/],
  [flows, 1, { seed: Number.NaN }, /seed must be a number/],
])("refuses %j, %j, %j", (values, u, options, message) =>
  expect(() => spreadInterval(values, u, options)).toThrow(message),
);
