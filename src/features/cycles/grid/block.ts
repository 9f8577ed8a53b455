import { type DraftFields, problemOf } from "../../../data/cycles/draft-fields";
import { sprayGrades } from "../../../db/vocabulary";
import type { Edit } from "../draft/draft-state";
import { fieldAt, type GridColumn, type GridModel, type GridRow } from "./grid-model";

export type CellPlace = { row: number; column: number };
/** Two corners, both included. */
export type Range = { from: CellPlace; to: CellPlace };
type BlockResult = { edits: Edit[] } | { problem: string };

/** Cells of a spreadsheet come as lines of tab-separated texts; texts with a line break or a quote come quoted. */
export function readBlock(text: string): string[][] {
  const lines: string[][] = [];
  let cells: string[] = [];
  const end = text.replace(/\r\n?/g, "\n").replace(/\n$/, "");
  for (const [, quoted, plain, mark] of end.matchAll(/(?:"((?:[^"]|"")*)"|([^\t\n]*))(\t|\n|$)/g)) {
    cells.push((quoted?.replaceAll('""', '"') ?? plain ?? "").trim());
    if (mark === "\t") continue;
    lines.push(cells);
    cells = [];
    if (mark === "") break;
  }
  return lines;
}

/** All rows that can be typed into, top to bottom. */
export function typedRows(model: GridModel): GridRow[] {
  return [...model.top, ...model.rows];
}

/** Puts a block of texts at a cell: wholly, or not at all with the reason. */
export function placeBlock(model: GridModel, block: string[][], at: CellPlace): BlockResult {
  const rows = typedRows(model).slice(at.row, at.row + block.length);
  const wide = Math.max(...block.map((line) => line.length));
  const columns = model.columns.slice(at.column, at.column + wide);
  if (rows.length < block.length || columns.length < wide)
    return {
      problem: `The block is ${block.length} × ${wide}, rows by columns; from this cell only ${rows.length} × ${columns.length} fit. Nothing was pasted.`,
    };
  const edits: Edit[] = [];
  for (const [line, cells] of block.entries())
    for (const [index, text] of cells.entries()) {
      const placed = placeText(rows[line]!, columns[index]!, text);
      if ("problem" in placed)
        return {
          problem: `Row ${line + 1}, column ${index + 1} of the block: ${placed.problem} Nothing was pasted.`,
        };
      edits.push(...placed.edits);
    }
  return { edits };
}

function placeText(row: GridRow, column: GridColumn, text: string): BlockResult {
  const field = fieldAt(row, column);
  if (!field)
    return text === "" ? { edits: [] } : { problem: `nothing can be typed where “${text}” would go.` };
  const value = column.kind === "check" && column.key === "sprayGrade" ? text.toLowerCase() : text;
  const problem = problemOf(field, value);
  if (problem && column.kind === "check" && column.key === "sprayGrade")
    return { problem: `“${text}” is none of ${sprayGrades.join(", ")}.` };
  return problem ? { problem: `“${text}”: ${problem}` } : { edits: [{ field, value }] };
}

export function cellsOf({ from, to }: Range): CellPlace[] {
  const cells: CellPlace[] = [];
  for (let row = Math.min(from.row, to.row); row <= Math.max(from.row, to.row); row++)
    for (let column = Math.min(from.column, to.column); column <= Math.max(from.column, to.column); column++)
      cells.push({ row, column });
  return cells;
}

/** The first line of a range goes down to its last; a single cell takes the text above it. */
export function fillDown(model: GridModel, fields: DraftFields, range: Range): Edit[] {
  const rows = typedRows(model);
  const top = Math.min(range.from.row, range.to.row);
  const bottom = Math.max(range.from.row, range.to.row);
  const source = top === bottom ? top - 1 : top;
  if (!rows[source]) return [];
  return cellsOf({
    ...range,
    from: { row: source + 1, column: range.from.column },
    to: { row: bottom, column: range.to.column },
  }).flatMap(({ row, column }) => {
    const from = fieldAt(rows[source]!, model.columns[column]!);
    const field = fieldAt(rows[row]!, model.columns[column]!);
    return from && field ? [{ field, value: fields[from] ?? "" }] : [];
  });
}

export function clearCells(model: GridModel, range: Range): Edit[] {
  const rows = typedRows(model);
  return cellsOf(range).flatMap(({ row, column }) => {
    const field = fieldAt(rows[row]!, model.columns[column]!);
    return field ? [{ field, value: "" }] : [];
  });
}

/** A range as a spreadsheet takes it. */
export function copyBlock(model: GridModel, fields: DraftFields, range: Range): string {
  const rows = typedRows(model);
  const lines = new Map<number, string[]>();
  for (const { row, column } of cellsOf(range)) {
    const field = fieldAt(rows[row]!, model.columns[column]!);
    lines.set(row, [...(lines.get(row) ?? []), field ? (fields[field] ?? "") : ""]);
  }
  return [...lines.values()].map((cells) => `${cells.join("\t")}\n`).join("");
}
