import "server-only";
import type { MarkKind } from "./marks";
import type { TextStyle } from "./print-style";

export type CellLine = { text: string; style: TextStyle; mark?: MarkKind };

/** Lines one below the other. */
export type Cell = readonly CellLine[];

export type Column = {
  /** Lines of the head. */
  title: readonly string[];
  align: "left" | "right";
  /** Share of the room that is left over; such a column wraps its text instead of claiming its natural width. */
  flex?: number;
  /** All columns so marked are as wide as the widest of them. */
  even?: boolean;
};

export type Row = { cells: readonly Cell[]; rule?: "strong" };

export type TableSpec = { columns: readonly Column[]; rows: readonly Row[] };
