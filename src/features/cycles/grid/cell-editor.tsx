"use client";
import type { CustomCellEditorProps } from "ag-grid-react";
import { useEffect, useRef } from "react";
import type { GridContext } from "./grid-context";
import type { GridColumn, GridRow } from "./grid-model";

type Props = CustomCellEditorProps<GridRow, string, GridContext> & { gridColumn: GridColumn };

/** Typed over when it began with a key, continued when it began with Enter, F2 or a tap. */
export function CellEditor({ value, onValueChange, eventKey, gridColumn, context, data }: Props) {
  const input = useRef<HTMLInputElement>(null);
  const isText =
    gridColumn.kind === "check" && (gridColumn.key === "note" || gridColumn.key === "sprayGrade");

  // biome-ignore lint/correctness/useExhaustiveDependencies: how editing began counts once
  useEffect(() => {
    const typedKey = eventKey?.length === 1 ? eventKey : null;
    if (typedKey !== null) onValueChange(typedKey);
    input.current?.focus();
    if (typedKey === null) input.current?.select();
  }, []);

  return (
    <input
      ref={input}
      value={value ?? ""}
      onChange={(event) => onValueChange(event.target.value)}
      inputMode={isText ? "text" : "decimal"}
      maxLength={isText ? 500 : 24}
      aria-label={context.current.nameOf(data, gridColumn)}
      autoComplete="off"
      spellCheck={false}
      className="bench-cell-input"
    />
  );
}
