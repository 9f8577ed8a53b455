import { describe, expect, test } from "vitest";
import { draftField } from "../../src/data/cycles/draft-fields";
import { readSheet } from "../../src/data/cycles/sheet/read-sheet";
import { clearCells, copyBlock, fillDown, placeBlock, readBlock } from "../../src/features/cycles/grid/block";
import { stepOf, takeBack } from "../../src/features/cycles/grid/edit-history";
import { expandGrade } from "../../src/features/cycles/grid/expand-grade";
import { gridModelOf } from "../../src/features/cycles/grid/grid-model";
import { nextTyped } from "../../src/features/cycles/grid/next-place";

const injectors = [1, 2, 3].map((position) => ({
  setInjectorId: `00000000-0000-4000-8000-00000000000${position}`,
  position,
  tag: `26-0147/${position}`,
  serial: null,
}));
const [first, second] = injectors.map((injector) => injector.setInjectorId) as [string, string];
const fields = {
  [draftField.column("w1", "pulseWidthMs")]: "2",
  [draftField.column("w1", "pulseCount")]: "1000",
  [draftField.column("w2", "pulseWidthMs")]: "4",
  [draftField.column("w2", "pulseCount")]: "1000",
};
const model = gridModelOf(readSheet(fields, injectors), injectors, false);
// Columns: label, channel, w1, w2, checks; rows: width, pulses, three injectors.
const at = { row: 2, column: 2 };

describe("a block from a spreadsheet", () => {
  test("lines, tabs, quoted cells and a closing line break are read", () => {
    expect(readBlock("1\t2\r\n3\t4\r\n")).toEqual([
      ["1", "2"],
      ["3", "4"],
    ]);
    expect(readBlock('"a ""b"""\t\n\t5')).toEqual([
      ['a "b"', ""],
      ["", "5"],
    ]);
  });

  test("goes to the cells from the focused one on, decimal commas and all", () => {
    expect(placeBlock(model, readBlock("7,5\t22\n7.6\t23"), at)).toEqual({
      edits: [
        { field: draftField.reading(first, "w1", 1), value: "7,5" },
        { field: draftField.reading(first, "w2", 1), value: "22" },
        { field: draftField.reading(second, "w1", 1), value: "7.6" },
        { field: draftField.reading(second, "w2", 1), value: "23" },
      ],
    });
  });

  test("that does not fit is refused whole", () => {
    expect(placeBlock(model, readBlock("1\n2\n3\n4"), at)).toEqual({
      problem: "The block is 4 × 1, rows by columns; from this cell only 3 × 1 fit. Nothing was pasted.",
    });
  });

  test("with a text that is no number is refused whole, naming the cell", () => {
    const placed = placeBlock(model, readBlock("1\t2\n3\tx"), at);
    expect("problem" in placed && placed.problem).toMatch(/^Row 2, column 2 of the block: “x”: Amount/);
  });
});

describe("ranges", () => {
  const typed = { ...fields, [draftField.reading(first, "w1", 1)]: "7.5" };
  const column = { from: at, to: { row: 4, column: 2 } };

  test("fill down repeats the first line", () => {
    expect(fillDown(model, typed, column).map((edit) => edit.value)).toEqual(["7.5", "7.5"]);
  });

  test("fill down on one cell takes the text above it", () => {
    const cell = { row: 3, column: 2 };
    expect(fillDown(model, typed, { from: cell, to: cell })).toEqual([
      { field: draftField.reading(second, "w1", 1), value: "7.5" },
    ]);
  });

  test("what was cleared is taken back, unless it was typed over since", () => {
    const step = stepOf(typed, clearCells(model, column));
    expect(takeBack(step, fields)).toEqual([{ field: draftField.reading(first, "w1", 1), value: "7.5" }]);
    expect(takeBack(step, { ...fields, [draftField.reading(first, "w1", 1)]: "8" })).toEqual([]);
  });

  test("a copied range pastes back as it was", () => {
    const copied = copyBlock(model, typed, column);
    expect(placeBlock(model, readBlock(copied), at)).toMatchObject({ edits: [{ value: "7.5" }, {}, {}] });
  });
});

describe("Enter and Tab", () => {
  test("Enter goes down a pulse width and on to the next one's top", () => {
    expect(nextTyped(model, { row: 2, column: 2 }, "Enter", false)).toEqual({ row: 3, column: 2 });
    expect(nextTyped(model, { row: 4, column: 2 }, "Enter", false)).toEqual({ row: 2, column: 3 });
  });

  test("Tab goes along the row, and leaves the grid behind its last cell", () => {
    expect(nextTyped(model, { row: 2, column: 2 }, "Tab", false)).toEqual({ row: 2, column: 3 });
    const last = { row: 4, column: model.columns.length - 1 };
    expect(nextTyped(model, last, "Tab", false)).toBeNull();
  });
});

test("the first letter of a spray grade is enough", () => {
  expect(["g", "Acc", "no", "x", ""].map(expandGrade)).toEqual(["good", "acceptable", "no spray", "x", ""]);
});
