import { beforeAll, describe, expect, test } from "vitest";
import { type CycleFigures, evaluateCycle, fitFlowLine, spread } from "@/metrology";
import { type InjectorTruth, normalsFrom } from "../../../seed/factories/synthetic-bench";
import { expectedMisses } from "../support/misses";
import { type SyntheticCycle, syntheticCycle } from "../support/synthetic-cycle";

const cycles = 300;
const { least, most } = expectedMisses(cycles, 0.05);

type Asked = Parameters<typeof syntheticCycle>[1];
type Evaluated = { figures: CycleFigures; truths: InjectorTruth[] };

/** Two injectors far enough apart that their spread is large against its uncertainty, with straight lines. */
const apart = (truths: InjectorTruth[]) =>
  truths.map((truth, place) => ({
    ...truth,
    shortPulseLossUl: 0,
    staticMlPerMin: truth.staticMlPerMin * (1 + 0.03 * place),
    deadTimeMs: truth.deadTimeMs + 0.05 * place,
  }));

function evaluated(asked: Asked, count = cycles): Evaluated[] {
  return Array.from({ length: count }, (_, seed) => {
    const { input, truths }: SyntheticCycle = syntheticCycle(seed, { count: 2, truly: apart, ...asked });
    return { figures: evaluateCycle(input, { draws: 1000 }), truths };
  });
}

function expectAsOftenAsStated(all: Evaluated[], holds: (one: Evaluated) => boolean): void {
  const missed = all.filter((one) => !holds(one)).length;
  expect(missed).toBeGreaterThanOrEqual(least);
  expect(missed).toBeLessThanOrEqual(most);
}

describe.each<[string, Asked]>([
  ["one reading at each of seven widths", {}],
  ["pulse counts that differ", { pulseCount: (width) => (width < 4 ? 1600 : 600) }],
  ["a balance instead of a cylinder", { collects: "mass" }],
  ["2 % above the reference pressure", { pressureKpa: 306 }],
])("the truth lies within what is stated at 95 % in 95 of 100 cycles: %s", (_, asked) => {
  let all: Evaluated[];
  beforeAll(() => {
    all = evaluated(asked);
  });

  test("static flow", () =>
    expectAsOftenAsStated(all, ({ figures, truths }) => {
      const { value, expandedUncertainty } = figures.injectors[0]!.staticFlow!;
      return Math.abs(value - truths[0]!.staticMlPerMin) <= expandedUncertainty;
    }));

  test("spread of the static flow, of the line and held open", () => {
    const truly = (truths: InjectorTruth[]) => spread(truths.map((t) => t.staticMlPerMin)).spreadPercent;
    for (const which of ["staticSpread", "heldOpenSpread"] as const)
      expectAsOftenAsStated(all, ({ figures, truths }) => isWithin(truly(truths), figures[which]!.interval));
  });

  test("spread of the fuel at 4 ms", () =>
    expectAsOftenAsStated(all, ({ figures, truths }) => {
      const fuels = truths.map((t) => t.staticMlPerMin * (4 - t.deadTimeMs));
      const atWidth = figures.widths.find(({ pulseWidthMs }) => pulseWidthMs === 4)!;
      return isWithin(spread(fuels).spreadPercent, atWidth.spread!.interval);
    }));

  test("range of the dead times", () =>
    expectAsOftenAsStated(all, ({ figures, truths }) => {
      const { rangeMs, expandedUncertainty } = figures.deadTimeRange!;
      return Math.abs(rangeMs - (truths[1]!.deadTimeMs - truths[0]!.deadTimeMs)) <= expandedUncertainty;
    }));
});

test("Fieller's interval holds the dead time of a line with scatter alone in 95 of 100", () => {
  const normal = normalsFrom(41);
  const [trials, deadTime] = [1000, 0.9];
  let missed = 0;
  for (let trial = 0; trial < trials; trial++) {
    const { deadTimeInterval } = fitFlowLine(
      [2.5, 3, 4, 6, 10, 15].map((width) => ({
        pulseWidthMs: width,
        volumePerPulseUl: 7 * (width - deadTime) + 0.08 * normal(),
      })),
    );
    if (!isWithin(deadTime, deadTimeInterval!)) missed += 1;
  }
  const expected = expectedMisses(trials, 0.05);
  expect(missed).toBeGreaterThanOrEqual(expected.least);
  expect(missed).toBeLessThanOrEqual(expected.most);
});

test("the linear range leaves out what the needle's flight bends", () => {
  const truly = (truths: InjectorTruth[]) =>
    apart(truths).map((truth) => ({ ...truth, shortPulseLossUl: 1.2 }));
  const widths = [1.2, 1.3, 1.5, 2, 3, 4, 6, 10, 15];
  for (const { figures, truths } of evaluated({ truly, widths }, 50)) {
    const { staticFlow, flowLine } = figures.injectors[0]!;
    expect(flowLine!.linearRange.fromMs).toBeGreaterThan(1.2);
    expect(Math.abs(staticFlow!.value / truths[0]!.staticMlPerMin - 1)).toBeLessThan(0.015);
  }
});

function isWithin(value: number, { low, high }: { low: number; high: number }): boolean {
  return value >= low && value <= high;
}
