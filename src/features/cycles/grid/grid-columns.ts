import type { CellClassParams, ColDef, ColGroupDef, IRowNode } from "ag-grid-community";
import type { Sheet } from "../../../data/cycles/sheet/types";
import { formatNumber } from "../../../format/format-number";
import type { Edit } from "../draft/draft-state";
import { CellEditor } from "./cell-editor";
import { expandGrade } from "./expand-grade";
import { type GridContext, type GridSources, inRange } from "./grid-context";
import { fieldAt, type GridColumn, type GridModel, type GridRow, textAt } from "./grid-model";
import { LabelCell } from "./label-cell";

type Column = ColDef<GridRow, string>;

const checkHeads = {
  windingOhm: { head: "Winding, Ω", width: 92 },
  windingTemperatureC: { head: "at °C", width: 70 },
  insulationMegohm: { head: "Insulation, MΩ", width: 112 },
  leakageMm3PerMin: { head: "Leakage, mm³/min", width: 128 },
  sprayGrade: { head: "Spray", width: 104 },
  note: { head: "Note", width: 180 },
} as const;

/** The grid's columns; every cell reads its text from the sheet, none holds one of its own. */
export function columnsFor(
  model: GridModel,
  sheet: Sheet,
  unit: "mL" | "g",
  onEdit: (edits: Edit[]) => void,
): (Column | ColGroupDef<GridRow>)[] {
  return model.columns.map((column, index) => ({
    colId: column.id,
    ...headOf(column, sheet, unit),
    valueGetter: ({ data, context }) =>
      data ? shownText((context as GridContext).current, data, column) : "",
    valueSetter: ({ data, newValue }) => {
      const field = fieldAt(data, column);
      const isGrade = column.kind === "check" && column.key === "sprayGrade";
      if (field) onEdit([{ field, value: isGrade ? expandGrade(newValue ?? "") : (newValue ?? "").trim() }]);
      return field !== null;
    },
    editable: ({ data, context }) =>
      !(context as GridContext).current.readOnly && data !== undefined && fieldAt(data, column) !== null,
    cellEditor: CellEditor,
    cellEditorParams: { gridColumn: column },
    cellClass: (params) => classesOf(params, column, index),
    ...(column.kind === "label"
      ? { cellRenderer: LabelCell, pinned: "left" as const, lockPinned: true }
      : {}),
  }));
}

function headOf(column: GridColumn, sheet: Sheet, unit: "mL" | "g"): Column {
  if (column.kind === "label") return { headerName: "Injector", width: 148 };
  if (column.kind === "channel") return { headerName: "Channel", width: 76 };
  if (column.kind === "load") return { headerName: "Load", width: 60 };
  if (column.kind === "check")
    return { headerName: checkHeads[column.key].head, width: checkHeads[column.key].width };
  if (column.kind === "heldOpen") return { headerName: `Held open, ${unit}`, width: 100 };
  const width = sheet.columns.find((candidate) => candidate.id === column.columnId)?.pulseWidthMs;
  return {
    headerName: width ? `${formatNumber(width, "pulseWidth")} ms, ${unit}` : `New width, ${unit}`,
    width: 92,
  };
}

function shownText(sources: GridSources, row: GridRow, column: GridColumn): string {
  return sources.workedOut.get(`${row.id}/${column.id}`) ?? textAt(sources.fields, row, column);
}

function classesOf(params: CellClassParams<GridRow, string>, column: GridColumn, index: number): string[] {
  const { data, context, node } = params;
  if (!data) return [];
  const sources = (context as GridContext).current;
  const field = fieldAt(data, column);
  const mark = field ? sources.marks.get(field) : undefined;
  const place = { row: rowOf(node, sources), column: index };
  return [
    "bench-cell",
    column.kind === "label" || (column.kind === "check" && column.key === "note") ? "bench-cell-text" : "",
    field ? "bench-cell-typed" : "bench-cell-fixed",
    mark ? `bench-cell-${mark.kind}` : "",
    node.rowPinned !== "bottom" && inRange(sources.range, place) ? "bench-cell-in-range" : "",
    data.kind === "reading" && data.repeat > 1 && data.id.endsWith(`/${data.repeat}`)
      ? "bench-cell-repeat"
      : "",
  ].filter(Boolean);
}

function rowOf(node: IRowNode<GridRow>, sources: GridSources): number {
  const index = node.rowIndex ?? 0;
  return node.rowPinned === "top" ? index : index + sources.model.top.length;
}
