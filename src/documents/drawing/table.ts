import "server-only";
import type { Block } from "./block";
import { line } from "./lines";
import { drawMark } from "./marks";
import type { Pen } from "./pen";
import { colours, leadingOf, styles } from "./print-style";
import { markRoom, type PlacedColumn, placeColumns, type Setting, scaled } from "./table-columns";
import type { CellLine, Column, Row, TableSpec } from "./table-spec";
import { baselineOf } from "./text-blocks";

const padding = 2.7;
export const usualSetting: Setting = { scale: 1, gap: 8 };

type Place = { column: Column; placed: PlacedColumn };

/** A head to repeat on every page, and rows that stay whole. */
export function table(
  pen: Pen,
  spec: TableSpec,
  width: number,
  setting: Setting = usualSetting,
): { head: Block; rows: Block[] } {
  const columns = placeColumns(pen, spec, width, setting);
  const places = spec.columns.map((column, index) => ({ column, placed: columns[index]! }));
  return {
    head: headBlock(pen, places, width, setting),
    rows: spec.rows.map((row) => rowBlock(pen, places, row, width, setting)),
  };
}

function headBlock(pen: Pen, places: readonly Place[], width: number, setting: Setting): Block {
  const style = scaled(styles.key, setting);
  const leading = leadingOf(style);
  const lines = Math.max(...places.map(({ column }) => column.title.length));
  const height = lines * leading + padding;
  return {
    height,
    draw(x, y) {
      for (const place of places)
        for (const [index, text] of place.column.title.entries()) {
          const top = y + (lines - place.column.title.length + index) * leading;
          writeAligned(pen, { text, style }, place, x, baselineOf(top, style));
        }
      line(pen, [x, y + height], [x + width, y + height], { colour: colours.ink2, width: 0.6 });
    },
  };
}

function rowBlock(pen: Pen, places: readonly Place[], row: Row, width: number, setting: Setting): Block {
  const cells = row.cells.map((cell, index) => {
    const lines = cell.map((one) => ({ ...one, style: scaled(one.style, setting) }));
    const { column, placed } = places[index]!;
    return column.flex ? lines.flatMap((one) => wrapLine(pen, one, placed.width)) : lines;
  });
  const height = Math.max(...cells.map(heightOf)) + 2 * padding;
  return {
    height,
    draw(x, y) {
      if (row.rule === "strong") line(pen, [x, y], [x + width, y], { colour: colours.ink2, width: 0.6 });
      for (const [index, cell] of cells.entries()) {
        let top = y + (height - heightOf(cell)) / 2;
        for (const one of cell) {
          writeAligned(pen, one, places[index]!, x, baselineOf(top, one.style));
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

function writeAligned(pen: Pen, one: CellLine, { column, placed }: Place, x: number, baseline: number): void {
  const { align } = column;
  const edge = x + placed.x + (align === "right" ? placed.width : 0);
  const room = markRoom(one);
  if (one.mark) {
    const from = align === "right" ? edge - pen.measure(one.text, one.style) - room : edge;
    drawMark(pen, one.mark, from, baseline - one.style.size * 0.74, one.style.size * 0.78);
  }
  pen.write(one.text, align === "right" ? edge : edge + room, baseline, one.style, align);
}
