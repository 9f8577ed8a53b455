import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { type FlowPoint, fitFlowLine, fitLine, xIntercept } from "@/metrology";
import { publishedCase } from "../../support/published-case";
import { expectRelative } from "../support/expect-relative";
import { number } from "../support/numbers";

const at = (pulseWidthMs: number, volumePerPulseUl: number): FlowPoint => ({
  pulseWidthMs,
  volumePerPulseUl,
});
const onLine = (...widths: number[]) => widths.map((width) => at(width, 7 * (width - 0.9)));

test("a published injector: slope and x-intercept of the Sloan Automotive Laboratory's map", () => {
  type Rail = { p: number; q: number };
  const { points } = publishedCase<{ points: Rail[] }>("pressure-law", "gdi-mit-map");
  for (const { q } of points) {
    const offset = 0.0753;
    const line = fitFlowLine([1, 2, 3, 5].map((width) => at(width, q * (width - offset))));
    expectRelative(line.slopeUlPerMs, q, 1e-12);
    expectRelative(line.staticFlowMlPerMin, 60 * q, 1e-12);
    expectRelative(line.deadTimeMs, offset, 1e-10);
  }
});

test("the dead time is the x-intercept of the range, with its interval", () => {
  const readings = [at(3, 14.6), at(4, 21.9), at(6, 35.6), at(10, 63.8)];
  const line = fitFlowLine(readings);
  const bare = xIntercept(fitLine(readings.map((p) => ({ x: p.pulseWidthMs, y: p.volumePerPulseUl }))));
  expect(line.linearRange).toEqual({ fromMs: 3, toMs: 10, ratio: 10 / 3 });
  expect(line.deadTimeMs).toBe(bare.value);
  expect(line.deadTimeSeMs).toBe(bare.standardError);
  expect(line.deadTimeInterval).toEqual(bare.interval);
});

describe("the linear range", () => {
  const bent = [at(1.5, 2.4), at(2, 6.3), ...onLine(2.5, 3, 5, 8, 12, 16)];

  test("leaves out short pulses that bend away, and says by how much", () => {
    const { linearRange, deadTimeMs, points } = fitFlowLine(bent);
    expect(linearRange).toMatchObject({ fromMs: 2.5, toMs: 16 });
    expect(deadTimeMs).toBeCloseTo(0.9, 12);
    expect(points.map((point) => point.inLinearRange)).toEqual([false, false, ...Array(6).fill(true)]);
    expect(points[1]!.deviationPercent).toBeCloseTo((100 * (6.3 - 7.7)) / 7.7, 9);
  });

  test("is the widest by ratio of widths, not by count", () => {
    const broken = [...onLine(1.2, 1.4, 1.6, 4.8), at(6, 50), ...onLine(7, 8, 9, 10, 11)];
    expect(fitFlowLine(broken).linearRange).toMatchObject({ fromMs: 1.2, toMs: 4.8 });
  });

  test("holds readings up to the limit and no further", () => {
    const off = (share: number) => {
      const readings = onLine(2, 4, 6, 8);
      readings[0] = at(2, readings[0]!.volumePerPulseUl * (1 + share));
      return fitFlowLine(readings).linearRange.fromMs;
    };
    expect(off(0.06)).toBe(2);
    expect(off(0.8)).toBe(4);
  });

  test("takes in every repeat of a width or none", () => {
    const { linearRange, line } = fitFlowLine([...onLine(2, 3, 5, 8), at(2, 4)]);
    expect(linearRange.fromMs).toBe(3);
    expect(line.degreesOfFreedom).toBe(1);
  });

  test("agrees with trying every run from the start", () =>
    fc.assert(
      fc.property(fc.array(number(-0.15, 0.15), { minLength: 4, maxLength: 9 }), (deviations) => {
        const readings = deviations.map((d, i) => at(1.5 + i * 1.3, 7 * (0.6 + i * 1.3) * (1 + d)));
        const wanted = widestByTrying(readings);
        if (wanted) expect(fitFlowLine(readings).linearRange).toMatchObject(wanted);
        else expect(() => fitFlowLine(readings)).toThrow(/within ±5 % of a rising line/);
      }),
    ));
});

describe("refuses, saying why", () => {
  test.each([
    ["two widths", onLine(2, 4), /at least 3 different pulse widths for a line: 2 were given/],
    ["repeats of two", onLine(2, 4, 4, 2), /at least 3 different pulse widths/],
    ["no run", [at(1, 5), at(2, 1), at(3, 9), at(4, 2)], /3 neighbouring pulse widths within ±5 %/],
    ["falling flow", [at(1, 9), at(2, 6), at(3, 3)], /rising line/],
    ["no width", [at(0, 1), ...onLine(2, 4, 6)], /points\[0\]\.pulseWidthMs must be a number above 0/],
    ["no number", [...onLine(2, 4, 6), at(8, Number.NaN)], /points\[3\]\.volumePerPulseUl must be a number/],
  ])("%s", (_, readings, message) => expect(() => fitFlowLine(readings)).toThrow(message));

  test.each([
    [{ maxDeviationPercent: 0 }, /maxDeviationPercent must be a number above 0 and up to 100/],
    [{ minWidths: 1 }, /minWidths must be a number from 2/],
    [{ confidence: 1 }, /confidence must be a number above 0 and below 1/],
  ])("%j", (options, message) => expect(() => fitFlowLine(onLine(2, 4, 6), options)).toThrow(message));
});

test("order of readings and unit of volume change nothing but the unit", () =>
  fc.assert(
    fc.property(number(0.2, 1.5), number(1, 30), number(0.1, 10), (deadTime, slope, scale) => {
      const readings = [2, 3, 4.5, 7, 11].map((w, i) =>
        at(w, slope * (w - deadTime) * (1 + 0.004 * (i % 2))),
      );
      const line = fitFlowLine(readings);
      const reversed = fitFlowLine([...readings].reverse());
      const scaled = fitFlowLine(readings.map((p) => at(p.pulseWidthMs, scale * p.volumePerPulseUl)));
      expectRelative(reversed.deadTimeMs, line.deadTimeMs, 1e-9);
      expectRelative(scaled.deadTimeMs, line.deadTimeMs, 1e-9);
      expectRelative(scaled.staticFlowMlPerMin, scale * line.staticFlowMlPerMin, 1e-9);
    }),
  ));

/** The widest run of three or more whose own plain line keeps all its readings within 5 %. */
function widestByTrying(readings: FlowPoint[]): { fromMs: number; toMs: number } | null {
  let best: { fromMs: number; toMs: number } | null = null;
  for (let from = 0; from < readings.length; from++)
    for (let end = from + 3; end <= readings.length; end++) {
      const run = readings.slice(from, end);
      const { slope, intercept } = fitLine(run.map((p) => ({ x: p.pulseWidthMs, y: p.volumePerPulseUl })));
      const predicted = (p: FlowPoint) => intercept + slope * p.pulseWidthMs;
      const fits = run.every(
        (p) => predicted(p) > 0 && Math.abs(p.volumePerPulseUl / predicted(p) - 1) <= 0.05,
      );
      const [fromMs, toMs] = [run[0]!.pulseWidthMs, run.at(-1)!.pulseWidthMs];
      if (slope > 0 && fits && (!best || toMs / fromMs > best.toMs / best.fromMs)) best = { fromMs, toMs };
    }
  return best;
}
