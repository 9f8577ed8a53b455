import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { type CycleInput, evaluateCycle, fluidDensity, type Reading } from "@/metrology";
import { deviationsPercent, independentFigures, type RawCycle } from "../../support/independent-figures";
import { expectRelative } from "../support/expect-relative";
import { number } from "../support/numbers";
import { syntheticCycle } from "../support/synthetic-cycle";

const asRead = { gain: 1, offset: 0 };
const rising = (amounts: number[]): Reading[] =>
  amounts.map((amount, i) => ({ kind: "dynamic", pulseWidthMs: 2 + 2 * i, pulseCount: 1000, amount }));

/** One injector in a cylinder that shows what it holds. */
function cycleOf(readings: Reading[], conditions: Partial<CycleInput["conditions"]> = {}): CycleInput {
  const { input } = syntheticCycle(1, { count: 1 });
  const calibration = { gain: 1, offset: 0, gainU: 0, offsetU: 0 };
  const channel = { division: 0.2, calibration };
  return {
    ...input,
    conditions: { ...input.conditions, fluidTemperatureC: 20, ...conditions },
    injectors: [{ injectorId: "a", channel, readings }],
  };
}

const only = (input: CycleInput) => evaluateCycle(input).injectors[0]!;

describe("worked by hand", () => {
  test("10 mL in 1000 pulses are 10 µL per pulse; 20 mL in 10 s are 120 mL/min", () => {
    const { flows, heldOpen } = only(
      cycleOf([...rising([10]), { kind: "held open", openSeconds: 10, amount: 20 }]),
    );
    expect(flows[0]).toMatchObject({ volumePerPulseUl: 10, repeats: 1, dutyPercent: 10 });
    expect(heldOpen!.mlPerMin).toBeCloseTo(120, 12);
  });

  test("own uncertainty of a reading: division/√12 and repeatability, per pulse", () => {
    const { flows } = only(cycleOf(rising([10])));
    expectRelative(flows[0]!.ownU, Math.hypot(0.2 / Math.sqrt(12), 0.03), 1e-12);
  });

  test("repeats halve repeatability, not the resolution", () => {
    const { flows } = only(cycleOf([...rising([10]), ...rising([10]), ...rising([10]), ...rising([10])]));
    expectRelative(flows[0]!.ownU, Math.hypot(0.2 / Math.sqrt(12), 0.015), 1e-12);
    expect(flows[0]!.repeats).toBe(4);
  });

  test("a mass is a volume through the density of its temperature", () => {
    const density = fluidDensity("n-heptane", 27);
    const atReference = Math.sqrt(density / fluidDensity("n-heptane", 20));
    const { flows } = only(cycleOf(rising([10]), { collects: "mass", fluidTemperatureC: 27 }));
    expectRelative(flows[0]!.volumePerPulseUl, (10 / density) * atReference, 1e-12);
  });

  test("the channel's gain and offset come before everything", () => {
    const input = cycleOf(rising([10]));
    input.injectors[0]!.channel.calibration = { gain: 0.99, offset: 0.05, gainU: 0, offsetU: 0 };
    expectRelative(only(input).flows[0]!.volumePerPulseUl, 9.95, 1e-12);
  });

  test("away from the reference pressure flows stand, and the static flow follows the root law", () => {
    const at = (pressureKpa: number) => only(cycleOf(rising([10, 24, 38, 52]), { pressureKpa }));
    expect(at(400).flows[0]!.volumePerPulseUl).toBe(10);
    expectRelative(at(400).staticFlow!.value, at(300).staticFlow!.value * Math.sqrt(300 / 400), 1e-12);
    expectRelative(at(306).flows[0]!.volumePerPulseUl, 10 * Math.sqrt(300 / 306), 1e-12);
  });
});

describe("a second way, with school formulas", () => {
  test.each([
    ["equal pulse counts", { pulseCount: 800 }],
    ["pulse counts that weigh the points", { pulseCount: (width: number) => (width < 4 ? 1500 : 700) }],
    ["2 % off the reference pressure", { pressureKpa: 306 }],
  ])("%s", (_, asked) => {
    const { input } = syntheticCycle(3, { ...asked, count: 6, state: "asFound" });
    const warm = { ...input, conditions: { ...input.conditions, fluidTemperatureC: 25 } };
    const [ours, other] = [evaluateCycle(warm), independentFigures(rawOf(warm))];
    for (const [index, injector] of ours.injectors.entries()) {
      const second = other.injectors[index]!;
      for (const [i, flow] of injector.flows.entries())
        expectRelative(flow.volumePerPulseUl, second.flows[i]!, 1e-12);
      expectRelative(injector.staticFlow!.value, second.staticFlow, 1e-9);
      expectRelative(injector.heldOpen!.mlPerMin, second.heldOpen, 1e-12);
      expectRelative(injector.flowLine!.deadTimeMs, second.deadTime, 1e-9);
      expect(injector.closurePercent).toBeCloseTo(second.closurePercent, 7);
      // Its t has four digits.
      expectRelative(injector.flowLine!.deadTimeInterval!.low, second.interval[0], 1e-3);
      expectRelative(injector.flowLine!.deadTimeInterval!.high, second.interval[1], 1e-3);
    }
    expectRelative(ours.staticSpread!.spreadPercent, other.staticSpread, 1e-8);
    expectRelative(ours.deadTimeRange!.rangeMs, other.deadTimeRange, 1e-8);
    const deviations = deviationsPercent(other.injectors.map(({ staticFlow }) => staticFlow));
    for (const [i, deviation] of ours.staticSpread!.deviationsPercent.entries())
      expect(deviation).toBeCloseTo(deviations[i]!, 7);
  });
});

describe("what all injectors share", () => {
  const { input } = syntheticCycle(5, { count: 4 });
  const doubled = {
    ...input,
    conditions: {
      ...input.conditions,
      shared: { pressureKpa: 5, fluidTemperatureC: 1, pulseWidthMs: 0.01 },
    },
  };
  const [plain, uncertain] = [evaluateCycle(input), evaluateCycle(doubled)];

  test("counts for the static flow of one", () =>
    expect(uncertain.injectors[0]!.staticFlow!.expandedUncertainty).toBeGreaterThan(
      2 * plain.injectors[0]!.staticFlow!.expandedUncertainty,
    ));

  test("cancels in a spread", () => {
    expect(uncertain.staticSpread).toEqual(plain.staticSpread);
    expect(uncertain.widths).toEqual(plain.widths);
    expect(uncertain.deadTimeRange).toEqual(plain.deadTimeRange);
  });
});

describe("what cannot be used", () => {
  test.each([
    [[], "It has no reading at a pulse width yet."],
    [rising([10, 24]), "A line needs 3 pulse widths: there are 2."],
    [rising([30, 20, 10]), "No 3 neighbouring pulse widths lie within ±5 % of a rising line."],
    [rising([10, 24, Number.NaN]), /^A reading cannot be computed with: amount must be a number/],
  ])("%j has no line, and a sentence says why", (readings, sentence) => {
    const { flowLine, staticFlow, lineProblem } = only(cycleOf(readings));
    expect({ flowLine, staticFlow }).toEqual({ flowLine: null, staticFlow: null });
    expect(lineProblem).toMatch(sentence);
  });

  test("a pulse as long as the period is held open: it is not on the line", () => {
    const { flows, flowLine } = only(cycleOf(rising([8, 22, 36, 50, 64, 78, 92, 106, 120, 300])));
    expect(flows.at(-1)).toMatchObject({ pulseWidthMs: 20, dutyPercent: 100 });
    expect(flowLine!.linearRange.toMs).toBe(18);
  });

  test("one injector does not harm the others, but the set has no spread without it", () => {
    const { input } = syntheticCycle(5, { count: 3 });
    const [first, ...others] = input.injectors;
    const figures = evaluateCycle({ ...input, injectors: [{ ...first!, readings: [] }, ...others] });
    expect(figures.injectors.map(({ staticFlow }) => staticFlow === null)).toEqual([true, false, false]);
    expect(figures).toMatchObject({ staticSpread: null, deadTimeRange: null, widths: [] });
  });

  test.each([
    [{ periodMs: 0 }, /periodMs must be a number above 0/],
    [{ pressureKpa: Number.NaN }, /pressureKpa must be a number above 0/],
    [{ fluidTemperatureC: 60 }, /temperatureC of n-heptane must be a number from 0 and up to 40/],
    [{ repeatability: -1 }, /repeatability must be a number from 0/],
    [{ shared: { pressureKpa: -1, fluidTemperatureC: 0, pulseWidthMs: 0 } }, /shared\.pressureKpa/],
  ])("conditions of %j are refused", (conditions, message) =>
    expect(() => evaluateCycle(cycleOf(rising([10]), conditions))).toThrow(message),
  );
});

test("whatever was typed, no figure is NaN or infinite", () =>
  fc.assert(
    fc.property(fc.array(number(0, 300), { minLength: 9, maxLength: 9 }), (amounts) => {
      const { input } = syntheticCycle(1, { count: 3 });
      const injectors = input.injectors.map((injector, k) => ({
        ...injector,
        readings: rising(amounts.slice(3 * k, 3 * k + 3)),
      }));
      for (const figure of numbersIn(evaluateCycle({ ...input, injectors }, { draws: 100 })))
        expect(Number.isFinite(figure)).toBe(true);
    }),
  ));

test("the same readings give the same figures, in any order of injectors", () => {
  const { input } = syntheticCycle(8, { count: 5 });
  const figures = evaluateCycle(input);
  expect(evaluateCycle(input)).toEqual(figures);
  const turned = evaluateCycle({ ...input, injectors: [...input.injectors].reverse() });
  expect([...turned.injectors].reverse()).toEqual(figures.injectors);
  expectRelative(turned.staticSpread!.spreadPercent, figures.staticSpread!.spreadPercent, 1e-12);
});

function rawOf({ conditions, reference, injectors }: CycleInput): RawCycle {
  const dynamic = injectors[0]!.readings.flatMap((r) => (r.kind === "dynamic" ? [r] : []));
  return {
    temperatureC: conditions.fluidTemperatureC,
    pressureKpa: conditions.pressureKpa,
    division: injectors[0]!.channel.division,
    repeatability: conditions.repeatability,
    instruments: { gauge: asRead, thermometer: asRead, timer: asRead, ohmmeter: asRead },
    reference,
    widths: dynamic.map(({ pulseWidthMs, pulseCount }) => ({ ms: pulseWidthMs, count: pulseCount })),
    heldOpenSeconds: 10,
    injectors: injectors.map(({ channel, readings }) => ({
      channel: channel.calibration,
      amounts: readings.flatMap((r) => (r.kind === "dynamic" ? [r.amount] : [])),
      heldOpenMl: readings.find((r) => r.kind === "held open")!.amount,
      winding: { ohm: 12, temperatureC: 20 },
    })),
  };
}

function numbersIn(value: unknown): number[] {
  if (typeof value === "number") return [value];
  return value && typeof value === "object" ? Object.values(value).flatMap(numbersIn) : [];
}
