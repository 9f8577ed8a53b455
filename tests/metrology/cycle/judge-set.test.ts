import { describe, expect, test } from "vitest";
import { type CycleFigures, decide, evaluateCycle, judgeSet, type ToleranceClass } from "@/metrology";
import { syntheticCycle } from "../support/synthetic-cycle";

/** Injectors 2 % apart from one to the next, so that the spread is large against its uncertainty. */
const { input } = syntheticCycle(2, {
  count: 4,
  truly: (truths) =>
    truths.map((truth, i) => ({ ...truth, staticMlPerMin: truth.staticMlPerMin * (1 + 0.02 * i) })),
});
const figures = evaluateCycle(input);

const nothing: ToleranceClass = {
  name: "nothing",
  spreadLimits: [],
  staticSpreadPercent: null,
  deadTimeRangeMs: null,
  resistanceRangeOhm: null,
};
const judge = (limits: Partial<ToleranceClass>, more: object = {}, of: CycleFigures = figures) =>
  judgeSet({ figures: of, toleranceClass: { ...nothing, ...limits }, ...more });

describe("each criterion is decided with its own uncertainty", () => {
  const { spreadPercent, expandedUncertainty } = figures.staticSpread!;
  test.each([
    ["pass", spreadPercent + 1.01 * expandedUncertainty],
    ["conditional pass", spreadPercent + 0.5 * expandedUncertainty],
    ["conditional fail", spreadPercent - 0.5 * expandedUncertainty],
    ["fail", spreadPercent - 1.01 * expandedUncertainty],
  ])("static spread: %s", (verdict, staticSpreadPercent) => {
    const { criteria } = judge({ staticSpreadPercent });
    expect(criteria).toEqual([
      {
        kind: "static spread",
        value: spreadPercent,
        limit: staticSpreadPercent,
        expandedUncertainty,
        unit: "%",
        verdict,
      },
    ]);
  });

  test("dead-time range in ms", () =>
    expect(judge({ deadTimeRangeMs: 1 }).criteria).toEqual([
      expect.objectContaining({
        kind: "dead-time range",
        value: figures.deadTimeRange!.rangeMs,
        unit: "ms",
        verdict: "pass",
      }),
    ]));

  test("resistance range in Ω: uncertainties of the two ends joined", () => {
    const resistances = [12, 12.1, 12.3, 12.05].map((ohmsAt20C, i) => ({
      injectorId: `injector ${i + 1}`,
      ohmsAt20C,
      expandedUncertainty: i === 2 ? 0.04 : 0.03,
    }));
    const [criterion] = judge({ resistanceRangeOhm: 0.4 }, { resistances }).criteria;
    expect(criterion!.value).toBeCloseTo(0.3, 12);
    expect(criterion!.expandedUncertainty).toBeCloseTo(0.05, 12);
    expect(criterion!.verdict).toBe("pass");
  });

  test("leakage of every injector, as it stands where no uncertainty is known", () => {
    const leakages = figures.injectors.map(({ injectorId }, i) => ({ injectorId, mm3PerMin: i }));
    const { criteria, verdict } = judge({}, { leakages, leakageLimit: 2 });
    expect(criteria.map((criterion) => criterion.verdict)).toEqual(["pass", "pass", "pass", "fail"]);
    expect(verdict).toBe("fail");
  });
});

describe("limits on spread by pulse width", () => {
  test("hold from their width up to the next one's", () => {
    const { criteria } = judge({
      spreadLimits: [
        { fromPulseWidthMs: 4, spreadPercent: 1.5 },
        { fromPulseWidthMs: 2, spreadPercent: 4 },
      ],
    });
    expect(criteria.map(({ pulseWidthMs, limit }) => [pulseWidthMs, limit])).toEqual([
      [2, 4],
      [2.5, 4],
      [3, 4],
      [4, 1.5],
      [6, 1.5],
      [10, 1.5],
      [15, 1.5],
    ]);
  });

  test("one from where nothing was measured leaves the set open", () => {
    const { criteria, verdict } = judge({ spreadLimits: [{ fromPulseWidthMs: 18, spreadPercent: 5 }] });
    expect(criteria).toEqual([
      expect.objectContaining({ pulseWidthMs: 18, value: null, verdict: null, expandedUncertainty: 0 }),
    ]);
    expect(verdict).toBeNull();
  });
});

describe("the set", () => {
  test("is as good as its worst criterion", () =>
    expect(judge({ staticSpreadPercent: 50, deadTimeRangeMs: 0 }).verdict).toBe(
      decide(figures.deadTimeRange!.rangeMs, { high: 0 }, figures.deadTimeRange!.expandedUncertainty),
    ));

  test("has no verdict where a figure is missing or nothing is limited", () => {
    expect(judge({}).verdict).toBeNull();
    expect(judge({ resistanceRangeOhm: 0.5 }).verdict).toBeNull();
    expect(judge({}, { leakageLimit: 2 }).verdict).toBeNull();
    expect(judge({ staticSpreadPercent: 50 }, {}, { ...figures, staticSpread: null }).verdict).toBeNull();
  });

  test("names its rule", () => expect(judge({}).decisionRule).toMatch(/ILAC-G8:09\/2019 .*\(w = U\)/));
});
