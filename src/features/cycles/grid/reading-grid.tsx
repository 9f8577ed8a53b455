"use client";
import "./grid-modules";
import "./reading-grid.css";
import type { CellFocusedEvent, CellMouseDownEvent, CellPosition, GridApi } from "ag-grid-community";
import { AgGridReact } from "ag-grid-react";
import { type ClipboardEvent, useEffect, useMemo, useRef, useState } from "react";
import type { Sheet } from "../../../data/cycles/sheet/types";
import { gridTheme } from "../../../ui/grid/grid-theme";
import type { Edit } from "../draft/draft-state";
import { columnsFor } from "./grid-columns";
import type { GridSources } from "./grid-context";
import { fieldAt, type GridRow } from "./grid-model";
import { useGridKeys } from "./use-grid-keys";

type Props = Omit<GridSources, "range" | "takeTypedAhead"> & {
  sheet: Sheet;
  unit: "mL" | "g";
  onEdit: (edits: Edit[]) => void;
  onUndo: () => void;
};

/** Injectors by pulse widths, typed like a spreadsheet: arrows, Enter, Tab, ranges, paste, fill down, clear, undo. */
export function ReadingGrid({ sheet, unit, onEdit, onUndo, ...given }: Props) {
  const api = useRef<GridApi<GridRow> | null>(null);
  const sources = useRef<GridSources>({ ...given, range: null, takeTypedAhead: () => null });
  const [said, say] = useState("");
  const [focused, setFocused] = useState<string | null>(null);
  const edit = useRef((edits: Edit[]) => {
    say("");
    onEdit(edits);
  });
  const keys = useGridKeys({ sources, onEdit: (edits) => edit.current(edits), onUndo, say });
  sources.current = { ...given, range: keys.range, takeTypedAhead: keys.takeTypedAhead };
  edit.current = (edits) => {
    say("");
    onEdit(edits);
  };

  const shape = JSON.stringify([given.model, sheet.columns.map((column) => column.pulseWidthMs), unit]);
  // biome-ignore lint/correctness/useExhaustiveDependencies: the columns change with the grid's shape alone
  const columns = useMemo(
    () => columnsFor(given.model, sheet, unit, (edits) => edit.current(edits)),
    [shape],
  );

  // biome-ignore lint/correctness/useExhaustiveDependencies: cells read these when they are drawn again
  useEffect(() => {
    api.current?.refreshCells({ force: true });
  }, [given.fields, given.marks, given.workedOut, given.readOnly, keys.range]);

  function noteFocus({ column, rowIndex, rowPinned }: CellFocusedEvent<GridRow>) {
    const { model } = sources.current;
    const rows = rowPinned === "top" ? model.top : rowPinned === "bottom" ? model.bottom : model.rows;
    const id = typeof column === "object" ? column?.getColId() : column;
    const at = model.columns.find((candidate) => candidate.id === id);
    const row = rowIndex === null ? undefined : rows[rowIndex];
    setFocused(row && at ? fieldAt(row, at) : null);
  }

  function press({ event, column, rowIndex, rowPinned, api: grid }: CellMouseDownEvent<GridRow>) {
    const cell: CellPosition = { column, rowIndex: rowIndex ?? 0, rowPinned };
    keys.press(cell, event instanceof MouseEvent && event.shiftKey ? grid.getFocusedCell() : null);
  }

  function paste(event: ClipboardEvent) {
    const text = event.clipboardData.getData("text/plain");
    const typing = event.target instanceof HTMLInputElement;
    if (!api.current || text === "" || (typing && !/[\t\n]/.test(text.trim()))) return;
    event.preventDefault();
    api.current.stopEditing(true);
    keys.paste(api.current, text);
  }

  function copy(event: ClipboardEvent) {
    const text = event.target instanceof HTMLInputElement || !api.current ? null : keys.copy(api.current);
    if (text === null) return;
    event.preventDefault();
    event.clipboardData.setData("text/plain", text);
  }

  return (
    <div>
      <div className="bench-grid" onPaste={paste} onCopy={copy}>
        <AgGridReact<GridRow>
          theme={gridTheme}
          context={sources}
          columnDefs={columns}
          defaultColDef={{
            suppressKeyboardEvent: keys.onKey,
            suppressHeaderKeyboardEvent: () => true,
            sortable: false,
            resizable: false,
            suppressMovable: true,
          }}
          rowData={given.model.rows}
          pinnedTopRowData={given.model.top}
          pinnedBottomRowData={given.model.bottom}
          getRowId={({ data }) => data.id}
          domLayout="autoHeight"
          singleClickEdit={isCoarse()}
          stopEditingWhenCellsLoseFocus
          onGridReady={(event) => {
            api.current = event.api;
          }}
          onCellFocused={noteFocus}
          onCellMouseDown={press}
        />
      </div>
      <GridLine said={said} reason={focused ? given.marks.get(focused)?.reason : undefined} />
    </div>
  );
}

/** One line below the grid: what was wrong with a paste, or why the cell is marked. */
function GridLine({ said, reason }: { said: string; reason: string | undefined }) {
  return (
    <p className="min-h-10 px-3 py-2 text-label" role="status">
      {said ||
        reason ||
        "Arrows, Enter and Tab move · Shift+arrows select · Ctrl+D fills down · Ctrl+V pastes · Ctrl+Z takes back"}
    </p>
  );
}

function isCoarse(): boolean {
  return typeof window !== "undefined" && window.matchMedia("(pointer: coarse)").matches;
}
