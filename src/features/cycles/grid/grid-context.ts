import type { DraftFields } from "../../../data/cycles/draft-fields";
import type { CellPlace, Range } from "./block";
import type { GridColumn, GridModel, GridRow } from "./grid-model";

/** Why a cell is marked: what was typed cannot be read, somebody else typed there too, or the reading is in doubt. */
export type Mark = { kind: "wrong" | "conflict" | "doubtful" | "acknowledged"; reason: string };

/** What the grid's cells read when they draw themselves. */
export type GridSources = {
  model: GridModel;
  fields: DraftFields;
  marks: Map<string, Mark>;
  range: Range | null;
  /** Texts of cells that are worked out, by row and column id. */
  workedOut: Map<string, string>;
  readOnly: boolean;
  nameOf: (row: GridRow, column: GridColumn) => string;
  /** What was typed into a cell before its editor was there; it is handed over once. */
  takeTypedAhead: () => string | null;
  labelOf: (row: GridRow) => { main: string; beside: string };
};

export type GridContext = { current: GridSources };

export function inRange(range: Range | null, place: CellPlace): boolean {
  if (!range) return false;
  const { from, to } = range;
  return (
    place.row >= Math.min(from.row, to.row) &&
    place.row <= Math.max(from.row, to.row) &&
    place.column >= Math.min(from.column, to.column) &&
    place.column <= Math.max(from.column, to.column)
  );
}
