import { describe, expect, test } from "vitest";
import {
  dataNumber,
  formatNumber,
  formatQuantity,
  formatRange,
  formatSigned,
  formatUncertainty,
  formatWithUncertainty,
} from "@/format/format-number";

const space = "\u00a0";
const missing = [null, undefined, Number.NaN, Number.POSITIVE_INFINITY];

test.each([
  [442.349, "staticFlow", "442.3"],
  [0.9427, "deadTime", "0.943"],
  [-1.234, "deviation", "−1.23"],
  [-0.001, "deviation", "0.00"],
  [2.5, "pulseWidth", "2.5"],
  [3, "pulseWidth", "3"],
  [1000, "pulseCount", "1000"],
  [10, "tolerance", "10"],
] as const)("%s as %s: %s", (value, quantity, digits) => expect(formatNumber(value, quantity)).toBe(digits));

test("a unit stands behind a space that does not break", () => {
  expect(formatQuantity(442.349, "staticFlow")).toBe(`442.3${space}mL/min`);
  expect(formatQuantity(1.2, "ratio")).toBe("1.20");
});

test.each([
  [1.2, "+1.20"],
  [-0.3, "−0.30"],
  [0, "0.00"],
  [0.004, "0.00"],
  [-0.004, "0.00"],
])("a deviation of %s says its direction: %s", (value, text) =>
  expect(formatSigned(value, "deviation")).toBe(text),
);

describe("an uncertainty", () => {
  test("has the decimals of its value", () => {
    expect(formatWithUncertainty(0.9421, 0.0112, "deadTime")).toBe("0.942 ± 0.011");
    expect(formatWithUncertainty(442.31, 1.66, "staticFlow", { unit: true })).toBe(
      `442.3 ± 1.7${space}mL/min`,
    );
  });

  test("is never rounded away to nothing", () => {
    expect(formatUncertainty(0.0001, "deadTime")).toBe("0.001");
    expect(formatUncertainty(0, "deadTime")).toBe("0.000");
  });

  test("may be unknown", () => expect(formatWithUncertainty(0.9421, null, "deadTime")).toBe("0.942"));
});

test("a range names its unit once", () =>
  expect(formatRange(1.5, 10, "pulseWidth")).toBe(`1.5 … 10${space}ms`));

test("data files have an ASCII minus and the same digits", () => {
  expect(dataNumber(-1.234, "deviation")).toBe("-1.23");
  expect(dataNumber(-0.001, "deviation")).toBe("0.00");
});

test.each(missing)("%s is no figure", (value) => {
  expect(formatNumber(value, "spread")).toBe("–");
  expect(formatQuantity(value, "spread")).toBe("–");
  expect(formatSigned(value, "deviation")).toBe("–");
  expect(formatWithUncertainty(value, 1, "spread")).toBe("–");
  expect(formatRange(value, 1, "spread")).toBe("–");
  expect(dataNumber(value, "spread")).toBe("");
});
