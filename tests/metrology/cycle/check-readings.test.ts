import { describe, expect, test } from "vitest";
import { type CheckAgainst, type CycleInput, checkReadings, type Doubt, evaluateCycle } from "@/metrology";
import type { InjectorTruth } from "../../../seed/factories/synthetic-bench";
import { exchange, misread, shift, typeTwice } from "../support/slips";
import { syntheticCycle } from "../support/synthetic-cycle";

const sets = Array.from({ length: 40 }, (_, seed) => seed + 1);
const model = { ratedFlowMlPerMin: 440, ratedFlowBandPercent: 4, ratedPressureKpa: 300 };

const evaluate = (input: CycleInput) => evaluateCycle(input, { draws: 100 });
const check = (input: CycleInput, against?: CheckAgainst) => checkReadings(input, evaluate(input), against);

/** A set as it comes in: its injectors differ by more than readings do. */
const flows = [0, 3, -2, 4.5, 1, -3.5, 2, -1];
const unlike = (truths: InjectorTruth[]) =>
  truths.map((truth, place) => ({
    ...truth,
    staticMlPerMin: truth.staticMlPerMin * (1 + flows[place]! / 100),
  }));

const matched = sets.map((seed) => syntheticCycle(seed).input);
const mixed = sets.map((seed) => syntheticCycle(seed, { truly: unlike }).input);

/** Of 40 sets with the same slip, how many are told so. */
const found = (
  inputs: CycleInput[],
  slip: (input: CycleInput) => CycleInput,
  is: (doubt: Doubt) => boolean,
) => inputs.filter((input) => check(slip(input)).some(is)).length;

describe("one amount misread", () => {
  test.each([
    [4, 0.05],
    [4, -0.1],
    [15, -0.03],
    [2, 0.1],
    [6, 9],
  ])("at %s ms by a share of %s is off the line, and the only one", (width, share) => {
    for (const input of matched) {
      const doubts = check(misread(input, width, 2, share)).filter(
        ({ kind }) => kind !== "outlier at a width",
      );
      expect(doubts).toEqual([
        expect.objectContaining({ kind: "off the line", injectorId: "injector 3", pulseWidthMs: width }),
      ]);
    }
  });

  test("says what the other widths predict", () => {
    const [doubt] = check(misread(matched[0]!, 6, 2, 0.05));
    expect(doubt).toMatchObject({ repeat: 1, deviationPercent: expect.closeTo(5, 0) });
  });
});

describe("columns", () => {
  test.each([2.5, 6])("two injectors exchanged at %s ms", (width) => {
    const pair = ["injector 4", "injector 6"];
    const told = found(
      mixed,
      (input) => exchange(input, width, [3, 5]),
      (doubt) =>
        doubt.kind === "two injectors exchanged in a column" &&
        doubt.pulseWidthMs === width &&
        pair.includes(doubt.injectorId) &&
        pair.includes(doubt.otherInjectorId),
    );
    expect(told).toBeGreaterThanOrEqual(38);
  });

  test.each([3, 10])("shifted by an injector at %s ms", (width) => {
    const told = found(
      mixed,
      (input) => shift(input, width),
      (doubt) =>
        doubt.kind === "column shifted by an injector" && doubt.pulseWidthMs === width && doubt.shift === 1,
    );
    expect(told).toBeGreaterThanOrEqual(38);
  });

  test.each([
    [6, 4],
    [3, 4],
    [10, 15],
  ])("at %s ms holding the amounts of %s ms, and nothing else is said", (into, from) => {
    for (const input of matched)
      expect(check(typeTwice(input, into, from)).filter(({ kind }) => kind !== "outlier at a width")).toEqual(
        [
          expect.objectContaining({
            kind: "column of another pulse width",
            pulseWidthMs: into,
            likelyPulseWidthMs: from,
          }),
        ],
      );
  });
});

describe("a bad injector", () => {
  const weak = (truths: InjectorTruth[]) =>
    truths.map((truth, place) => (place === 4 ? { ...truth, staticMlPerMin: 400 } : truth));
  const inputs = sets.map((seed) => syntheticCycle(seed, { truly: weak }).input);

  test("stands out of its set", () =>
    expect(
      found(
        inputs,
        (input) => input,
        (doubt) => doubt.kind === "outlier at a width" && doubt.injectorId === "injector 5" && !doubt.weak,
      ),
    ).toBe(40));

  test("stands outside the model's band", () => {
    for (const input of inputs)
      expect(check(input, { model })).toContainEqual(
        expect.objectContaining({
          kind: "outside the model's band",
          injectorId: "injector 5",
          bandPercent: 4,
        }),
      );
  });

  test("the band is brought to the reference pressure by the root law", () => {
    const at250 = { ...model, ratedFlowMlPerMin: 440 * Math.sqrt(250 / 300), ratedPressureKpa: 250 };
    expect(check(matched[0]!, { model: at250 })).toEqual([]);
  });
});

test("two injectors exchanged since an earlier cycle", () => {
  const exchanged = (truths: InjectorTruth[]) => {
    const all = unlike(truths);
    return all.map((truth, place) => (place === 1 ? all[5]! : place === 5 ? all[1]! : truth));
  };
  for (const [index, seed] of sets.entries()) {
    const earlier = evaluate(mixed[index]!);
    const later = syntheticCycle(seed, { truly: exchanged }).input;
    expect(check(later, { earlier })).toContainEqual(
      expect.objectContaining({
        kind: "two injectors exchanged in the cycle",
        injectorId: "injector 2",
        otherInjectorId: "injector 6",
      }),
    );
    expect(check(mixed[index]!, { earlier })).toEqual([]);
  }
});

test("duty over 100 %, flow that does not rise, and a line far from held open", () => {
  const short = syntheticCycle(1, { count: 1, widths: [3, 4, 6, 10, 20] }).input;
  expect(check(short)).toContainEqual(
    expect.objectContaining({ kind: "duty over 100 %", pulseWidthMs: 20, dutyPercent: 100 }),
  );
  const level = misread(syntheticCycle(2, { count: 1, widths: [3, 4, 10] }).input, 4, 0, -0.5);
  expect(check(level).map(({ kind }) => kind)).toContain("not rising");
  const [injector] = short.injectors;
  const leaking = injector!.readings.map((reading) =>
    reading.kind === "held open" ? { ...reading, amount: reading.amount * 1.1 } : reading,
  );
  const apart = { ...short, injectors: [{ ...injector!, readings: leaking }] };
  expect(check(apart)).toContainEqual(
    expect.objectContaining({ kind: "closure over 5 %", closurePercent: expect.closeTo(-9, 0) }),
  );
});
