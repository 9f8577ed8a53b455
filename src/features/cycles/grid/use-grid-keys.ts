import type { CellPosition, GridApi, SuppressKeyboardEventParams } from "ag-grid-community";
import { useRef, useState } from "react";
import type { Edit } from "../draft/draft-state";
import {
  type CellPlace,
  clearCells,
  copyBlock,
  fillDown,
  placeBlock,
  type Range,
  readBlock,
  typedRows,
} from "./block";
import type { GridContext } from "./grid-context";
import { fieldAt, type GridRow } from "./grid-model";
import { isArrow, neighbour, nextTyped } from "./next-place";

type Hands = {
  sources: GridContext;
  onEdit: (edits: Edit[]) => void;
  onUndo: () => void;
  say: (message: string) => void;
};
type Api = GridApi<GridRow>;

/** Moves, ranges, fill down, clear, copy, paste and undo, on the grid's own cell focus. */
export function useGridKeys({ sources, onEdit, onUndo, say }: Hands) {
  const [range, setRange] = useState<Range | null>(null);
  /** Editing began with a typed key: then arrows leave the cell instead of moving in its text. */
  const typedOver = useRef(false);
  /** Keys that came since editing began and before the editor was there: fast hands and scanners are ahead of it. */
  const typedAhead = useRef<string | null>(null);

  function placeOf(cell: CellPosition | null): CellPlace | null {
    const { model } = sources.current;
    const column = model.columns.findIndex((candidate) => candidate.id === cell?.column.getColId());
    if (!cell || cell.rowPinned === "bottom" || column < 0) return null;
    return { row: cell.rowPinned === "top" ? cell.rowIndex : cell.rowIndex + model.top.length, column };
  }

  function go(api: Api, place: CellPlace): void {
    const { model } = sources.current;
    const columnId = model.columns[place.column]!.id;
    const pinned = place.row < model.top.length;
    const rowIndex = pinned ? place.row : place.row - model.top.length;
    api.ensureColumnVisible(columnId);
    if (!pinned) api.ensureIndexVisible(rowIndex);
    api.setFocusedCell(rowIndex, columnId, pinned ? "top" : null);
  }

  function onKey({ event, editing, api }: SuppressKeyboardEventParams<GridRow>): boolean {
    const place = placeOf(api.getFocusedCell());
    if (!place) return false;
    const held = event.ctrlKey || event.metaKey || event.altKey;
    const next = held ? null : nextOf(event, place, editing);
    if (editing && typedAhead.current !== null && isSign(event, held)) {
      typedAhead.current += event.key;
      event.preventDefault();
      return true;
    }
    if (next) {
      if (editing) stopEditing(api, place);
      setRange(event.shiftKey && isArrow(event.key) ? { from: range?.from ?? place, to: next } : null);
      if (!(event.shiftKey && isArrow(event.key))) go(api, next);
    }
    if (next || (!editing && actOn(event, held, range ?? { from: place, to: place }))) {
      event.preventDefault();
      return true;
    }
    if (!editing) {
      typedOver.current = isSign(event, held);
      typedAhead.current = typedOver.current ? event.key : null;
    }
    if (event.key === "Escape") setRange(null);
    return false;
  }

  /** An editor that is not there yet has nothing to hand over, so what was typed ahead of it is put in its place. */
  function stopEditing(api: Api, { row, column }: CellPlace): void {
    const { model } = sources.current;
    const ahead = takeTypedAhead();
    api.stopEditing(ahead !== null);
    const field = ahead === null ? null : fieldAt(typedRows(model)[row]!, model.columns[column]!);
    if (field && ahead !== null) onEdit([{ field, value: ahead.trim() }]);
  }

  function takeTypedAhead(): string | null {
    const ahead = typedAhead.current;
    typedAhead.current = null;
    return ahead;
  }

  function nextOf(event: KeyboardEvent, place: CellPlace, editing: boolean): CellPlace | null {
    const { model } = sources.current;
    if (event.key === "Enter" || event.key === "Tab")
      return nextTyped(model, place, event.key, event.shiftKey);
    if (!isArrow(event.key) || (editing && !typedOver.current)) return null;
    return neighbour(model, event.shiftKey && range ? range.to : place, event.key);
  }

  function actOn(event: KeyboardEvent, held: boolean, at: Range): boolean {
    const { model, fields, readOnly } = sources.current;
    const letter = held ? event.key.toLowerCase() : "";
    if (readOnly) return false;
    if (letter === "z") onUndo();
    else if (letter === "d") onEdit(fillDown(model, fields, at));
    else if (event.key === "Delete" || event.key === "Backspace") onEdit(clearCells(model, at));
    else return false;
    return true;
  }

  function paste(api: Api, text: string): void {
    const place = placeOf(api.getFocusedCell());
    if (!place || sources.current.readOnly) return;
    const placed = placeBlock(sources.current.model, readBlock(text), range ? cornerOf(range) : place);
    if ("problem" in placed) say(placed.problem);
    else onEdit(placed.edits);
  }

  function copy(api: Api): string | null {
    const place = placeOf(api.getFocusedCell());
    const { model, fields } = sources.current;
    return place && copyBlock(model, fields, range ?? { from: place, to: place });
  }

  /** A click takes the range away; with Shift it reaches from the focused cell to the clicked one. */
  function press(cell: CellPosition, from: CellPosition | null): void {
    const [start, to] = [placeOf(from), placeOf(cell)];
    setRange(start && to ? { from: start, to } : null);
  }

  return { range, onKey, paste, copy, press, takeTypedAhead };
}

function isSign(event: KeyboardEvent, held: boolean): boolean {
  return event.key.length === 1 && !held;
}

function cornerOf({ from, to }: Range): CellPlace {
  return { row: Math.min(from.row, to.row), column: Math.min(from.column, to.column) };
}
