import "server-only";
import type { Block } from "./block";
import { line } from "./lines";
import { drawMark } from "./marks";
import type { Pen } from "./pen";
import { colours, leadingOf, styles } from "./print-style";
import { markRoom, type PlacedColumn, placeColumns } from "./table-columns";
import type { CellLine, Column, Row, TableSpec } from "./table-spec";
import { baselineOf } from "./text-blocks";

const padding = 3.2;

/** A head to repeat on every page, and rows that stay whole. */
export function table(pen: Pen, spec: TableSpec, width: number): { head: Block; rows: Block[] } {
  const placed = placeColumns(pen, spec, width);
  return {
    head: headBlock(pen, spec.columns, placed, width),
    rows: spec.rows.map((row) => rowBlock(pen, spec.columns, placed, row, width)),
  };
}

function headBlock(
  pen: Pen,
  columns: readonly Column[],
  placed: readonly PlacedColumn[],
  width: number,
): Block {
  const leading = leadingOf(styles.key);
  const lines = Math.max(...columns.map(({ title }) => title.length));
  const height = lines * leading + padding + 1;
  return {
    height,
    draw(x, y) {
      for (const [index, { title, align }] of columns.entries())
        for (const [place, text] of title.entries()) {
          const top = y + (lines - title.length + place) * leading;
          writeAligned(
            pen,
            { text, style: styles.key },
            placed[index]!,
            align,
            x,
            baselineOf(top, styles.key),
          );
        }
      line(pen, [x, y + height], [x + width, y + height], { colour: colours.ink2, width: 0.6 });
    },
  };
}

function rowBlock(
  pen: Pen,
  columns: readonly Column[],
  placed: readonly PlacedColumn[],
  row: Row,
  width: number,
): Block {
  const cells = row.cells.map((cell, index) =>
    columns[index]!.flex ? cell.flatMap((one) => wrapLine(pen, one, placed[index]!.width)) : cell,
  );
  const height = Math.max(...cells.map(heightOf)) + 2 * padding;
  return {
    height,
    draw(x, y) {
      if (row.rule === "strong") line(pen, [x, y], [x + width, y], { colour: colours.ink2, width: 0.6 });
      for (const [index, cell] of cells.entries()) {
        let top = y + (height - heightOf(cell)) / 2;
        for (const one of cell) {
          const { align } = columns[index]!;
          writeAligned(pen, one, placed[index]!, align, x, baselineOf(top, one.style));
          top += leadingOf(one.style);
        }
      }
      line(pen, [x, y + height], [x + width, y + height], { colour: colours.hair2 });
    },
  };
}

function heightOf(cell: readonly CellLine[]): number {
  return cell.reduce((sum, { style }) => sum + leadingOf(style), 0);
}

/** Only the first line of what was wrapped carries the mark. */
function wrapLine(pen: Pen, one: CellLine, width: number): CellLine[] {
  const lines = pen.wrap(one.text, width - markRoom(one), one.style);
  return lines.map((text, index) => ({ text, style: one.style, mark: index === 0 ? one.mark : undefined }));
}

function writeAligned(
  pen: Pen,
  one: CellLine,
  column: PlacedColumn,
  align: "left" | "right",
  x: number,
  baseline: number,
): void {
  const edge = x + column.x + (align === "right" ? column.width : 0);
  const room = markRoom(one);
  if (one.mark) {
    const from = align === "right" ? edge - pen.measure(one.text, one.style) - room : edge;
    drawMark(pen, one.mark, from, baseline - one.style.size * 0.74, one.style.size * 0.78);
  }
  pen.write(one.text, align === "right" ? edge : edge + room, baseline, one.style, align);
}
