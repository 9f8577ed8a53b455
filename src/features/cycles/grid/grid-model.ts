import { type CheckKey, type DraftFields, draftField } from "../../../data/cycles/draft-fields";
import type { Sheet, SheetInjector } from "../../../data/cycles/sheet/types";

export type GridRow =
  | { kind: "width"; id: string }
  | { kind: "amountOfPulses"; id: string }
  | { kind: "reading"; id: string; setInjectorId: string; repeat: number }
  | { kind: "mean"; id: string }
  | { kind: "spread"; id: string };

export type GridColumn =
  | { kind: "label"; id: string }
  | { kind: "channel"; id: string }
  | { kind: "load"; id: string }
  | { kind: "width"; id: string; columnId: string }
  | { kind: "heldOpen"; id: string; columnId: string }
  | { kind: "check"; id: string; key: GridCheck };

export type GridModel = {
  top: GridRow[];
  rows: GridRow[];
  bottom: GridRow[];
  columns: GridColumn[];
};

export const gridChecks = [
  "windingOhm",
  "windingTemperatureC",
  "insulationMegohm",
  "leakageMm3PerMin",
  "sprayGrade",
  "note",
] as const satisfies CheckKey[];
export type GridCheck = (typeof gridChecks)[number];

/** Which rows and columns the grid shows: injectors by place, run after run, with the checks in the first run. */
export function gridModelOf(sheet: Sheet, injectors: SheetInjector[], loads: boolean): GridModel {
  const runs = Array.from({ length: sheet.repeats }, (_, index) => index + 1);
  return {
    top: [
      { kind: "width", id: "width" },
      { kind: "amountOfPulses", id: "pulses" },
    ],
    rows: runs.flatMap((repeat) =>
      injectors.map(({ setInjectorId }) => ({
        kind: "reading" as const,
        id: `${setInjectorId}/${repeat}`,
        setInjectorId,
        repeat,
      })),
    ),
    bottom: [
      { kind: "mean", id: "mean" },
      { kind: "spread", id: "spread" },
    ],
    columns: [
      { kind: "label", id: "label" },
      { kind: "channel", id: "channel" },
      ...(loads ? [{ kind: "load" as const, id: "load" }] : []),
      ...sheet.columns.map((column) => ({
        kind: column.heldOpen ? ("heldOpen" as const) : ("width" as const),
        id: column.id,
        columnId: column.id,
      })),
      ...gridChecks.map((key) => ({ kind: "check" as const, id: key, key })),
    ],
  };
}

/** The field that a cell edits; null where nothing can be typed. */
export function fieldAt(row: GridRow, column: GridColumn): string | null {
  if (row.kind === "width")
    return column.kind === "width" ? draftField.column(column.columnId, "pulseWidthMs") : null;
  if (row.kind === "amountOfPulses") {
    if (column.kind === "width") return draftField.column(column.columnId, "pulseCount");
    return column.kind === "heldOpen" ? draftField.column(column.columnId, "openSeconds") : null;
  }
  if (row.kind !== "reading") return null;
  if (column.kind === "width" || column.kind === "heldOpen")
    return draftField.reading(row.setInjectorId, column.columnId, row.repeat);
  if (row.repeat > 1) return null;
  if (column.kind === "channel") return draftField.channel(row.setInjectorId);
  if (column.kind === "load") return draftField.load(row.setInjectorId);
  return column.kind === "check" ? draftField.check(row.setInjectorId, column.key) : null;
}

/** The text that stands in a cell. */
export function textAt(fields: DraftFields, row: GridRow, column: GridColumn): string {
  const field = fieldAt(row, column);
  return field ? (fields[field] ?? "") : "";
}
