import "server-only";
import type { Pen } from "./pen";
import { styles } from "./print-style";
import type { CellLine, Column, TableSpec } from "./table-spec";

/** x is the left edge of the column's room, cell padding taken off. */
export type PlacedColumn = { x: number; width: number };

export const columnGap = 8;
const narrowestFlex = 54;

export function markRoom({ mark, style }: CellLine): number {
  return mark ? style.size * 0.78 + 3 : 0;
}

/** Natural widths first; what is left goes to the columns that flex, or else to all but the first alike. */
export function placeColumns(pen: Pen, spec: TableSpec, width: number): PlacedColumn[] {
  const natural = spec.columns.map((_, index) => naturalWidth(pen, spec, index));
  const spare = width - sumOf(natural) - columnGap * (natural.length - 1);
  const flexSum = sumOf(spec.columns.map(({ flex = 0 }) => flex));
  const share = ({ flex = 0 }: Column, index: number) => {
    if (flexSum > 0) return (spare * flex) / flexSum;
    return index === 0 ? 0 : spare / Math.max(1, natural.length - 1);
  };
  let x = 0;
  return spec.columns.map((column, index) => {
    const own = Math.max(0, natural[index]! + share(column, index));
    const placed = { x, width: own };
    x += own + columnGap;
    return placed;
  });
}

/** What the table needs at least, flexing columns at their narrowest. */
export function leastWidth(pen: Pen, spec: TableSpec): number {
  const natural = spec.columns.map((_, index) => naturalWidth(pen, spec, index));
  return sumOf(natural) + columnGap * (natural.length - 1);
}

function naturalWidth(pen: Pen, spec: TableSpec, index: number): number {
  const column = spec.columns[index]!;
  const head = Math.max(0, ...column.title.map((text) => pen.measure(text, styles.key)));
  if (column.flex) return Math.max(head, narrowestFlex);
  const lines = spec.rows.flatMap((row) => row.cells[index] ?? []);
  return Math.max(head, ...lines.map((cell) => pen.measure(cell.text, cell.style) + markRoom(cell)));
}

function sumOf(numbers: readonly number[]): number {
  return numbers.reduce((sum, value) => sum + value, 0);
}
