import "server-only";
import type { Pen } from "./pen";
import { styles, type TextStyle } from "./print-style";
import type { CellLine, Column, TableSpec } from "./table-spec";

/** x is the left edge of the column's room. */
export type PlacedColumn = { x: number; width: number };

/** How closely a table is set: a share of the usual size of type, and the room between columns in points. */
export type Setting = { scale: number; gap: number };

const narrowestFlex = 54;

export function scaled(style: TextStyle, { scale }: Setting): TextStyle {
  return scale === 1 ? style : { ...style, size: style.size * scale };
}

export function markRoom({ mark, style }: CellLine): number {
  return mark ? style.size * 0.78 + 3 : 0;
}

/** Natural widths first; what is left goes to the columns that flex, or else to all but the first alike. */
export function placeColumns(pen: Pen, spec: TableSpec, width: number, setting: Setting): PlacedColumn[] {
  const natural = naturalWidths(pen, spec, setting);
  const spare = width - sumOf(natural) - setting.gap * (natural.length - 1);
  const flexSum = sumOf(spec.columns.map(({ flex = 0 }) => flex));
  const share = ({ flex = 0 }: Column, index: number) => {
    if (flexSum > 0) return (spare * flex) / flexSum;
    return index === 0 ? 0 : spare / Math.max(1, natural.length - 1);
  };
  let x = 0;
  return spec.columns.map((column, index) => {
    const own = Math.max(0, natural[index]! + share(column, index));
    const placed = { x, width: own };
    x += own + setting.gap;
    return placed;
  });
}

/** What the table needs at least, columns that flex at their narrowest. */
export function leastWidth(pen: Pen, spec: TableSpec, setting: Setting): number {
  return sumOf(naturalWidths(pen, spec, setting)) + setting.gap * (spec.columns.length - 1);
}

export function naturalWidths(pen: Pen, spec: TableSpec, setting: Setting): number[] {
  const widths = spec.columns.map((column, index) => {
    const key = scaled(styles.key, setting);
    const head = Math.max(0, ...column.title.map((text) => pen.measure(text, key)));
    if (column.flex) return Math.max(head, narrowestFlex);
    const lines = spec.rows.flatMap((row) => row.cells[index] ?? []);
    return Math.max(
      head,
      ...lines.map((one) => {
        const style = scaled(one.style, setting);
        return pen.measure(one.text, style) + markRoom({ ...one, style });
      }),
    );
  });
  const widest = Math.max(0, ...widths.filter((_, index) => spec.columns[index]!.even));
  return widths.map((width, index) => (spec.columns[index]!.even ? widest : width));
}

function sumOf(numbers: readonly number[]): number {
  return numbers.reduce((sum, value) => sum + value, 0);
}
