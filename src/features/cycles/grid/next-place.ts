import { type CellPlace, typedRows } from "./block";
import { fieldAt, type GridModel } from "./grid-model";

const arrows: Record<string, CellPlace> = {
  ArrowUp: { row: -1, column: 0 },
  ArrowDown: { row: 1, column: 0 },
  ArrowLeft: { row: 0, column: -1 },
  ArrowRight: { row: 0, column: 1 },
};

export function isArrow(key: string): boolean {
  return key in arrows;
}

/** The cell beside, also one that cannot be typed into; the same one at an edge. */
export function neighbour(model: GridModel, place: CellPlace, key: string): CellPlace {
  const by = arrows[key] ?? { row: 0, column: 0 };
  return {
    row: clamp(place.row + by.row, 0, typedRows(model).length - 1),
    column: clamp(place.column + by.column, 0, model.columns.length - 1),
  };
}

/**
 * Where Enter and Tab go. Enter goes down one pulse width, as the cylinders are read, and on to the top of the next column;
 * Tab goes along the row and on to the next. Null where the grid ends, so that focus can leave it.
 */
export function nextTyped(
  model: GridModel,
  place: CellPlace,
  key: "Enter" | "Tab",
  back: boolean,
): CellPlace | null {
  const order = key === "Enter" ? byColumn(model) : byRow(model);
  const here = order.findIndex((cell) => cell.row === place.row && cell.column === place.column);
  if (here < 0) return neighbour(model, place, key === "Enter" ? "ArrowDown" : "ArrowRight");
  return order[here + (back ? -1 : 1)] ?? null;
}

function byRow(model: GridModel): CellPlace[] {
  return typedRows(model).flatMap((_, row) =>
    model.columns.flatMap((_column, column) => (canType(model, { row, column }) ? [{ row, column }] : [])),
  );
}

function byColumn(model: GridModel): CellPlace[] {
  return model.columns.flatMap((_, column) =>
    typedRows(model).flatMap((_row, row) =>
      row >= model.top.length && canType(model, { row, column }) ? [{ row, column }] : [],
    ),
  );
}

function canType(model: GridModel, { row, column }: CellPlace): boolean {
  return fieldAt(typedRows(model)[row]!, model.columns[column]!) !== null;
}

function clamp(value: number, low: number, high: number): number {
  return Math.max(low, Math.min(value, high));
}
