import { describe, expect, test } from "vitest";
import { draftField, isDraftField, problemOf } from "../../src/data/cycles/draft-fields";
import { conditionOf } from "../../src/data/cycles/sheet/condition";
import { problemsOf } from "../../src/data/cycles/sheet/problems-of";
import { readSheet } from "../../src/data/cycles/sheet/read-sheet";

const injectors = [1, 2].map((position) => ({
  setInjectorId: `00000000-0000-4000-8000-00000000000${position}`,
  position,
  tag: `26-0147/${position}`,
  serial: null,
}));
const [first, second] = injectors.map((injector) => injector.setInjectorId) as [string, string];

describe("fields", () => {
  test.each([
    "benchId",
    "conditions.pressureKpa",
    "column.w24.pulseCount",
    "column.open.openSeconds",
    `reading.${first}.w1.20`,
    `check.${first}.sprayGrade`,
    `acknowledged.off-the-line/${first}/2`,
  ])("%s is one", (field) => expect(isDraftField(field)).toBe(true));

  test.each([
    "stage",
    "column.w25.pulseCount",
    "column.w0.pulseCount",
    `reading.${first}.w1.21`,
    "reading.x.w1.1",
    "__proto__",
    "constructor",
  ])("%s is none", (field) => expect(isDraftField(field)).toBe(false));

  test.each([
    ["12.5", null],
    ["12,5", null],
    [" 12 ", null],
    ["", null],
    ["-0", null],
    ["1e309", /exponent/],
    ["NaN", /not a number/],
    ["0x10", /not a number|letters/],
    ["１２", /not a number/],
    ["1_000", /split/],
    ["1.2.3", /decimal mark/],
    ["-1", /between 0 and 100000/],
    ["100001", /between 0 and 100000/],
    ["1.23456", /at most 4 decimals/],
  ])("an amount typed as %s", (text, problem) => {
    const said = problemOf(draftField.reading(first, "w1", 1), text);
    if (problem === null) expect(said).toBeNull();
    else expect(said).toMatch(problem);
  });
});

describe("reading the sheet", () => {
  const fields = {
    [draftField.column("w2", "pulseWidthMs")]: "4",
    [draftField.column("w2", "pulseCount")]: "1000",
    [draftField.column("w10", "pulseWidthMs")]: "2,5",
    [draftField.column("open", "openSeconds")]: "10",
    [draftField.reading(first, "w2", 1)]: "22,5",
    [draftField.reading(first, "w2", 3)]: "22.4",
    [draftField.reading(second, "w2", 1)]: "oops",
    [draftField.sharedCheck("windingTemperatureC")]: "21",
    [draftField.check(first, "windingOhm")]: "12.1",
    [draftField.check(second, "windingOhm")]: "12.2",
    [draftField.check(second, "windingTemperatureC")]: "24",
  };
  const sheet = readSheet(fields, injectors);

  test("columns stand by their number, held open last", () => {
    expect(sheet.columns.map((column) => column.id)).toEqual(["w2", "w10", "open"]);
    expect(sheet.columns[1]?.pulseWidthMs).toBe(2.5);
  });

  test("a run in which something was read is there, asked for or not", () => expect(sheet.repeats).toBe(3));

  test("a wrong text reads as nothing and is named", () => {
    expect(sheet.rows[1]?.readings).toEqual([]);
    const problems = problemsOf(fields, sheet, null);
    expect(problems[draftField.reading(second, "w2", 1)]?.[0]).toMatch(/^26-0147\/2, 4 ms, run 1: Amount/);
  });

  test("what is typed for all holds unless an injector has its own", () => {
    expect(sheet.rows.map((row) => row.checks.windingTemperatureC)).toEqual([21, 24]);
  });

  test("everything that is missing is named by its field", () => {
    const problems = problemsOf(fields, sheet, null);
    expect(Object.keys(problems)).toEqual(
      expect.arrayContaining([
        "benchId",
        "fluidId",
        "conditions.pressureKpa",
        "conditions.fluidTemperatureC",
        draftField.channel(first),
      ]),
    );
    expect(problems[draftField.column("w10", "pulseCount")]).toBeUndefined();
  });
});

test("a reading of 50 on an instrument with gain 1.002, offset −0.1 is 50.0; u = √(0.05² + (50·0.0006)² + 0.5²/12)", () => {
  const calibration = { gain: 1.002, offset: -0.1, gainU: 0.0006, offsetU: 0.05 };
  const condition = conditionOf({ division: 0.5, calibration }, 50);
  expect(condition.value).toBeCloseTo(50, 12);
  expect(condition.standardUncertainty).toBeCloseTo(Math.sqrt(0.05 ** 2 + 0.03 ** 2 + 0.25 / 12), 12);
});
