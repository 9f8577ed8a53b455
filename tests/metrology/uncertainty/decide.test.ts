import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { decide } from "@/metrology";
import { publishedCase } from "../../support/published-case";
import { number, unusable } from "../support/numbers";

type Rule = {
  inputs: { upper_limit: number; U_k2: number };
  expected: { measured: number; non_binary: string }[];
};
const { inputs, expected } = publishedCase<Rule>("decision-rules", "guard-upper-1");

describe("ILAC-G8:09/2019, non-binary statement with w = U", () => {
  test.each(expected)("$measured against at most 2 ± 0.4: $non_binary", ({ measured, non_binary }) =>
    expect(decide(measured, { high: inputs.upper_limit }, inputs.U_k2)).toBe(non_binary),
  );

  test.each([
    [9.4, "fail"],
    [9.5, "conditional fail"],
    [10, "conditional pass"],
    [10.5, "pass"],
    [11.5, "pass"],
    [11.6, "conditional pass"],
    [12.4, "conditional fail"],
    [12.6, "fail"],
  ])("%s between 10 and 12 with U = 0.5: %s", (value, verdict) =>
    expect(decide(value, { low: 10, high: 12 }, 0.5)).toBe(verdict),
  );

  test("decimals land where decimal arithmetic puts them: 0.1 + 0.2 against 0.3", () => {
    expect(decide(0.1 + 0.2, { high: 0.3 }, 0)).toBe("pass");
    expect(decide(0.7, { high: 0.8 }, 0.1)).toBe("pass");
    expect(decide(0.9, { high: 0.8 }, 0.1)).toBe("conditional fail");
  });

  test("limits nearer than 2 U leave no room for a pass", () =>
    expect(decide(11, { low: 10, high: 12 }, 1.5)).toBe("conditional pass"));

  test("without uncertainty there is nothing between pass and fail", () => {
    expect(decide(2, { high: 2 }, 0)).toBe("pass");
    expect(decide(2.001, { high: 2 }, 0)).toBe("fail");
  });
});

test.each([
  [1, {}, 0.1, /limits must hold low or high/],
  [1, { low: 2, high: 1 }, 0.1, /high must be a number from 2/],
  [1, { high: 2 }, -0.1, /expandedUncertainty must be a number from 0/],
])("refuses %s against %j with U = %s", (value, limits, uncertainty, message) =>
  expect(() => decide(value, limits, uncertainty)).toThrow(message),
);

test.each(unusable)("refuses %s", (value) =>
  expect(() => decide(value, { high: 2 }, 0.1)).toThrow(/value must be a number/),
);

const rank = ["fail", "conditional fail", "conditional pass", "pass"];

test("a value further inside is never judged worse, and a larger uncertainty never turns into a pass", () =>
  fc.assert(
    fc.property(number(0, 10), number(0, 10), number(0, 3), number(0, 3), (a, b, u, v) => {
      const [inner, outer] = [Math.min(a, b), Math.max(a, b)];
      const of = (value: number, uncertainty: number) => decide(value, { high: 5 }, uncertainty);
      expect(rank.indexOf(of(inner, u))).toBeGreaterThanOrEqual(rank.indexOf(of(outer, u)));
      if (of(a, Math.max(u, v)) === "pass") expect(of(a, Math.min(u, v))).toBe("pass");
    }),
  ));
