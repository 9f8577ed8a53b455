import { expect, test } from "vitest";
import { fitFlowLine, shortPulseTable } from "@/metrology";

/** A line of 7 µL/ms from 0.9 ms whose short pulses lose what the needle's flight takes. */
const delivered = (width: number) => 7 * (width - 0.9) - 2.5 * Math.exp(-(width - 0.9) / 0.3);
const measured = (...widths: number[]) =>
  fitFlowLine(widths.map((w) => ({ pulseWidthMs: w, volumePerPulseUl: delivered(w) })));

test("the width and its adder together deliver what the line says", () => {
  const line = measured(1.2, 1.3, 1.4, 1.5, 1.6, 1.8, 2, 2.5, 3, 5, 8, 12, 16);
  const table = shortPulseTable(line);
  expect(table.length).toBeGreaterThan(2);
  for (const { pulseWidthMs, adderMs } of table) {
    expect(pulseWidthMs).toBeLessThan(line.linearRange.fromMs);
    expect(adderMs).toBeGreaterThan(0);
    const wanted = line.line.intercept + line.line.slope * pulseWidthMs;
    expect(delivered(pulseWidthMs + adderMs)).toBeCloseTo(wanted, 1);
  }
});

test("adders grow toward the shortest pulses", () => {
  const adders = shortPulseTable(measured(1.2, 1.3, 1.4, 1.5, 1.6, 2, 3, 5, 8, 12)).map((row) => row.adderMs);
  expect(adders).toEqual([...adders].sort((a, b) => b - a));
});

test("is empty where every width lies on the line", () =>
  expect(shortPulseTable(measured(3, 4, 6, 8, 12))).toEqual([]));

test("says nothing where the fuel does not rise with the width, nor where no width delivers the line's fuel", () => {
  const readings = [1, 1.2, 3, 5, 8].map((w, i) => ({
    pulseWidthMs: w,
    volumePerPulseUl: i === 0 ? 9 : i === 1 ? 0.2 : 7 * (w - 0.9),
  }));
  expect(shortPulseTable(fitFlowLine(readings)).map((row) => row.pulseWidthMs)).toEqual([1.2]);
});
