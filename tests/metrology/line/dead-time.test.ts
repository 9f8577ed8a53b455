import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { deadTimeAt, deadTimeTable } from "@/metrology";
import { number } from "../support/numbers";

const cycles = [
  { volts: 14, deadTimeMs: 0.82, deadTimeSeMs: 0.01 },
  { volts: 8, deadTimeMs: 1.9, deadTimeSeMs: 0.03 },
  { volts: 16, deadTimeMs: 0.69 },
  { volts: 11, deadTimeMs: 1.18, deadTimeSeMs: null },
];

test("the table rises with the voltage and keeps what is known of the error", () =>
  expect(deadTimeTable(cycles)).toEqual([
    { volts: 8, deadTimeMs: 1.9, deadTimeSeMs: 0.03 },
    { volts: 11, deadTimeMs: 1.18, deadTimeSeMs: null },
    { volts: 14, deadTimeMs: 0.82, deadTimeSeMs: 0.01 },
    { volts: 16, deadTimeMs: 0.69, deadTimeSeMs: null },
  ]));

describe("between the voltages", () => {
  test.each(cycles)("$volts V is met exactly", ({ volts, deadTimeMs }) =>
    expect(deadTimeAt(cycles, volts)).toBeCloseTo(deadTimeMs, 12),
  );

  test("a straight table stays straight", () => {
    const straight = [8, 10, 14, 16].map((volts) => ({ volts, deadTimeMs: 3 - 0.1 * volts }));
    expect(deadTimeAt(straight, 12.3)).toBeCloseTo(1.77, 12);
  });

  test("the curve never turns: Fritsch and Carlson 1980", () =>
    fc.assert(
      fc.property(number(8, 16), number(8, 16), (a, b) => {
        const [low, high] = [Math.min(a, b), Math.max(a, b)];
        expect(deadTimeAt(cycles, high)).toBeLessThanOrEqual(deadTimeAt(cycles, low) + 1e-12);
      }),
    ));

  test("their example RPN 14 keeps its flat start and its rise", () => {
    const xs = [7.99, 8.09, 8.19, 8.7, 9.2, 10, 12, 15, 20];
    const ys = [0, 2.76429e-5, 4.37498e-2, 0.169183, 0.469428, 0.94374, 0.998636, 0.999919, 0.999994];
    const table = xs.map((volts, i) => ({ volts, deadTimeMs: ys[i]! }));
    const curve = Array.from({ length: 400 }, (_, i) => deadTimeAt(table, 7.99 + (12.01 * i) / 399));
    expect(curve.every((value, i) => i === 0 || value >= curve[i - 1]! - 1e-12)).toBe(true);
    expect(Math.max(...curve)).toBeLessThanOrEqual(0.999994 + 1e-12);
  });
});

test("nothing is said beyond the table", () => {
  expect(() => deadTimeAt(cycles, 7.9)).toThrow(/volts must be a number from 8 and up to 16: 7.9 was given/);
  expect(() => deadTimeAt(cycles, 16.1)).toThrow(/up to 16/);
  expect(() => deadTimeAt([], 14)).toThrow(/at least 1 voltage/);
});

test("bad cycles are named", () => {
  expect(() => deadTimeTable([cycles[0]!, cycles[0]!])).toThrow(
    /cycles must differ in volts: 14 was given twice/,
  );
  expect(() => deadTimeTable([{ volts: 0, deadTimeMs: 1 }])).toThrow(
    /cycles\[0\]\.volts must be a number above 0/,
  );
  expect(() => deadTimeTable([{ volts: 14, deadTimeMs: Number.NaN }])).toThrow(/cycles\[0\]\.deadTimeMs/);
});
