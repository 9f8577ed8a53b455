"use client";
import type { CustomCellEditorProps } from "ag-grid-react";
import { useLayoutEffect, useRef, useState } from "react";
import type { GridContext } from "./grid-context";
import type { GridColumn, GridRow } from "./grid-model";

type Props = CustomCellEditorProps<GridRow, string, GridContext> & { gridColumn: GridColumn };

/**
 * Typed over when it began with a key, continued when it began with Enter, F2 or a tap. Its text is its own: what the grid
 * hands back comes too late for somebody who types fast, and a figure must not lose its first digit.
 */
export function CellEditor({ value, onValueChange, eventKey, gridColumn, context, data }: Props) {
  const input = useRef<HTMLInputElement>(null);
  const [typedKey] = useState(() => (eventKey?.length === 1 ? eventKey : null));
  const [text, setText] = useState(() => (typedKey === null ? (value ?? "") : typedKey));
  const isText =
    gridColumn.kind === "check" && (gridColumn.key === "note" || gridColumn.key === "sprayGrade");

  function take(typed: string): void {
    setText(typed);
    onValueChange(typed);
  }

  const begun = useRef<string | null>(typedKey);
  // biome-ignore lint/correctness/useExhaustiveDependencies: how editing began counts once
  useLayoutEffect(() => {
    if (begun.current !== null) {
      begun.current = context.current.takeTypedAhead() ?? begun.current;
      take(begun.current);
    }
    input.current?.focus();
    if (typedKey === null) input.current?.select();
  }, []);

  return (
    <input
      ref={input}
      value={text}
      onChange={(event) => take(event.target.value)}
      inputMode={isText ? "text" : "decimal"}
      maxLength={isText ? 500 : 24}
      aria-label={context.current.nameOf(data, gridColumn)}
      autoComplete="off"
      spellCheck={false}
      className="bench-cell-input"
    />
  );
}
