import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { parseDecimal } from "@/format/parse-decimal";

test.each([
  ["12.5", 12.5, 1],
  ["12,5", 12.5, 1],
  [" 12 ", 12, 0],
  ["-0", 0, 0],
  ["−3.2", -3.2, 1],
  ["+7", 7, 0],
  [".5", 0.5, 1],
  [",5", 0.5, 1],
  ["007.10", 7.1, 2],
  ["0.000001", 0.000001, 6],
  ["123456789012345", 123456789012345, 0],
  ["\u00a012.5\t", 12.5, 1],
])("%j is %s with %s decimals", (typed, value, decimals) =>
  expect(parseDecimal(typed)).toEqual({ ok: true, value, decimals }),
);

test("minus nothing is nothing, without a sign", () =>
  expect(Object.is((parseDecimal("-0") as { value: number }).value, 0)).toBe(true));

test.each([
  ["", /please type a number/],
  ["   ", /please type a number/],
  ["1e309", /has an exponent; please write the digits out/],
  ["1.5E-3", /has an exponent/],
  ["NaN", /is not a number such as 12.5 or 12,5/],
  ["Infinity", /is not a number/],
  ["-Infinity", /is not a number/],
  ["0x10", /holds letters; please type the number alone/],
  ["12 mL", /holds letters/],
  ["１２", /is not a number/],
  ["١٢", /is not a number/],
  ["1_000", /is split; please type the digits without separators/],
  ["1 000", /is split/],
  ["1\u202f000", /is split/],
  ["1'000", /is split/],
  ["1.2.3", /has more than one decimal mark; please leave out thousands separators/],
  ["1,000.5", /more than one decimal mark/],
  ["12.", /ends with its decimal mark; please add a digit/],
  ["12,", /ends with its decimal mark/],
  [".", /decimal mark/],
  ["-", /is not a number/],
  ["--5", /is not a number/],
  ["1234567890123456", /has more than 15 digits/],
  ["=1+1", /is not a number/],
])("%j is refused and quoted", (typed, problem) => {
  const parsed = parseDecimal(typed);
  expect(parsed).toMatchObject({ ok: false, problem: expect.stringMatching(problem) });
  if (typed.trim() !== "") expect((parsed as { problem: string }).problem).toContain(`“${typed.trim()}”`);
});

test("a long text is quoted in short", () => {
  const { problem } = parseDecimal("x".repeat(500)) as { problem: string };
  expect(problem.length).toBeLessThan(90);
  expect(problem).toContain("…”");
});

describe("whatever is typed", () => {
  test("decimals up to 15 digits come back as the same decimal", () =>
    fc.assert(
      fc.property(
        fc.integer({ min: -999_999_999, max: 999_999_999 }),
        fc.integer({ min: 0, max: 6 }),
        (n, places) => {
          const text = (n / 10 ** places).toFixed(places);
          for (const typed of [text, text.replace(".", ",")]) {
            const parsed = parseDecimal(typed) as { ok: true; value: number; decimals: number };
            expect(parsed.value.toFixed(places)).toBe(Number(text).toFixed(places));
            expect(parsed.decimals).toBe(places);
          }
        },
      ),
    ));

  test("the answer is a finite number or a sentence", () =>
    fc.assert(
      fc.property(fc.string({ unit: "binary", maxLength: 40 }), (typed) => {
        const parsed = parseDecimal(typed);
        if (parsed.ok) expect(Number.isFinite(parsed.value)).toBe(true);
        else expect(parsed.problem).toMatch(/\.$/);
      }),
    ));
});
