"use client";
import type { CustomCellRendererProps } from "ag-grid-react";
import type { GridContext } from "./grid-context";
import type { GridRow } from "./grid-model";

/** Which injector a row is, or what its line of settings says. */
export function LabelCell({ data, context }: CustomCellRendererProps<GridRow, string, GridContext>) {
  if (!data) return null;
  const { main, beside } = context.current.labelOf(data);
  return (
    <span className="flex items-baseline gap-2 overflow-hidden">
      <span className="font-semibold">{main}</span>
      <span className="truncate text-ink-2">{beside}</span>
    </span>
  );
}
