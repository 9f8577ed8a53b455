"use client";
import { useMemo } from "react";
import type { CycleDraft } from "../../data/cycles";
import type { DraftFields } from "../../data/cycles/draft-fields";
import { Sheet } from "../../ui/layout/sheet";
import type { Edit } from "./draft/draft-state";
import type { Mark } from "./grid/grid-context";
import { type GridColumn, type GridRow, gridModelOf } from "./grid/grid-model";
import { ReadingGrid } from "./grid/reading-grid";
import { ColumnTools } from "./sheet/column-tools";
import { workedOut } from "./sheet/worked-out";
import type { Evaluation } from "./use-evaluation";

type Props = {
  draft: CycleDraft;
  evaluation: Evaluation;
  fields: DraftFields;
  marks: Map<string, Mark>;
  readOnly: boolean;
  onEdit: (edits: Edit[]) => void;
  onUndo: () => void;
};

/** The grid with what it needs to know of the set, and its tools. */
export function CycleGrid({ draft, evaluation, fields, marks, readOnly, onEdit, onUndo }: Props) {
  const { sheet, bench, figures } = evaluation;
  const { injectors } = draft;
  const loads =
    injectors.length > (bench?.channels.length ?? injectors.length) || sheet.rows.some((row) => row.load > 1);
  const shape = `${sheet.repeats} ${loads} ${sheet.columns.map((column) => column.id).join(" ")}`;
  // biome-ignore lint/correctness/useExhaustiveDependencies: rows and columns change with the sheet's shape alone
  const model = useMemo(() => gridModelOf(sheet, injectors, loads), [shape, injectors]);
  const unit = bench?.collects === "mass" ? "g" : "mL";

  function labelOf(row: GridRow) {
    if (row.kind === "width") return { main: "Pulse width", beside: "ms" };
    if (row.kind === "amountOfPulses") return { main: "Pulses", beside: "or seconds" };
    if (row.kind === "mean") return { main: "Mean", beside: "µL, mL/min" };
    if (row.kind === "spread") return { main: "Spread", beside: "%" };
    const injector = injectors.find((candidate) => candidate.setInjectorId === row.setInjectorId);
    const beside = row.repeat > 1 ? `run ${row.repeat}` : (injector?.serial ?? "");
    return { main: (injector?.tag ?? "").split("/").at(-1) ?? "", beside };
  }

  function nameOf(row: GridRow, column: GridColumn) {
    const width = sheet.columns.find((candidate) => candidate.id === column.id);
    const where = width?.heldOpen ? "held open" : width ? `${width.pulseWidthMs ?? "new"} ms` : column.id;
    return `${labelOf(row).main} ${labelOf(row).beside}, ${where}`;
  }

  return (
    <Sheet
      title="Readings"
      note={`as collected, ${unit}; ${injectors[0]?.tag.split("/")[0] ?? ""}`}
      padding="none"
    >
      <ReadingGrid
        model={model}
        sheet={sheet}
        unit={unit}
        fields={fields}
        marks={marks}
        workedOut={workedOut(sheet, figures)}
        readOnly={readOnly}
        nameOf={nameOf}
        labelOf={labelOf}
        onEdit={onEdit}
        onUndo={onUndo}
      />
      {readOnly ? null : <ColumnTools sheet={sheet} fields={fields} onEdit={onEdit} />}
    </Sheet>
  );
}
