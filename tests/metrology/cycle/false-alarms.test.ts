import { expect, test } from "vitest";
import { checkReadings, evaluateCycle } from "@/metrology";
import { syntheticCycle } from "../support/synthetic-cycle";

const cycles = 200;

/** A clean cycle may be doubted once in fifty: the technician then looks again, and no figure is changed. */
test.each<[string, Parameters<typeof syntheticCycle>[1]]>([
  ["eight injectors", {}],
  ["six", { count: 6 }],
  ["four", { count: 4 }],
  ["one", { count: 1 }],
  ["repeats", { repeats: 2 }],
  ["a balance", { collects: "mass" }],
  ["pulse counts that differ", { pulseCount: (width) => (width < 4 ? 1600 : 600) }],
])("at most 2 of 100 clean cycles are doubted: %s", (_, asked) => {
  let doubted = 0;
  for (let seed = 1; seed <= cycles; seed++) {
    const { input } = syntheticCycle(1000 + seed, asked);
    if (checkReadings(input, evaluateCycle(input, { draws: 100 })).length > 0) doubted += 1;
  }
  expect(doubted).toBeLessThanOrEqual(0.02 * cycles);
});
