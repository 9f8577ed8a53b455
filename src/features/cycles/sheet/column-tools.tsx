"use client";
import { Plus, X } from "lucide-react";
import {
  type DraftFields,
  draftField,
  heldOpenColumn,
  mostColumns,
  widthColumnId,
} from "../../../data/cycles/draft-fields";
import type { Sheet, SheetColumn } from "../../../data/cycles/sheet/types";
import { formatQuantity } from "../../../format/format-number";
import { Button } from "../../../ui/form/button";
import type { Edit } from "../draft/draft-state";

type Props = { sheet: Sheet; fields: DraftFields; onEdit: (edits: Edit[]) => void };

/** Pulse widths come and go as a whole, with their readings. */
export function ColumnTools({ sheet, fields, onEdit }: Props) {
  const ids = sheet.columns.map((column) => column.id);
  const free = Array.from({ length: mostColumns }, (_, index) => widthColumnId(index + 1)).find(
    (id) => !ids.includes(id),
  );
  const lastCount = sheet.columns.findLast((column) => column.pulseCount !== null)?.pulseCount ?? 1000;

  return (
    <div className="flex flex-wrap items-center gap-1.5 px-3 py-2">
      <span className="text-key text-ink-2">Columns</span>
      {sheet.columns.map((column) => (
        <Button
          key={column.id}
          size="small"
          kind="quiet"
          aria-label={`Take away ${nameOf(column)} with its readings`}
          onClick={() => onEdit(takeAway(fields, column.id))}
        >
          {nameOf(column)}
          <X aria-hidden="true" size={13} />
        </Button>
      ))}
      {free ? (
        <Button
          size="small"
          onClick={() => onEdit([{ field: draftField.column(free, "pulseCount"), value: String(lastCount) }])}
        >
          <Plus aria-hidden="true" size={13} />
          Pulse width
        </Button>
      ) : null}
      {ids.includes(heldOpenColumn) ? null : (
        <Button
          size="small"
          onClick={() => onEdit([{ field: draftField.column(heldOpenColumn, "openSeconds"), value: "10" }])}
        >
          <Plus aria-hidden="true" size={13} />
          Held open
        </Button>
      )}
    </div>
  );
}

function nameOf(column: SheetColumn): string {
  if (column.heldOpen) return "held open";
  return column.pulseWidthMs === null ? "new width" : formatQuantity(column.pulseWidthMs, "pulseWidth");
}

function takeAway(fields: DraftFields, columnId: string): Edit[] {
  const its = new RegExp(`^(?:column|reading\\.[^.]+)\\.${columnId}\\.`);
  return Object.keys(fields)
    .filter((field) => its.test(field))
    .map((field) => ({ field, value: "" }));
}
