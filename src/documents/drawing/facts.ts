import "server-only";
import { type Block, beside, stack } from "./block";
import { frame, line } from "./lines";
import { drawMark, type MarkKind, markColour } from "./marks";
import type { Pen } from "./pen";
import { colours, styles, type TextStyle } from "./print-style";
import { paragraph } from "./text-blocks";

/** A key in small type with its value below; `notes` stand under the value. */
export type Fact = { key: string; value: string; notes?: readonly string[]; mark?: MarkKind };

const inner = { x: 7, y: 5 };

function factBlock(pen: Pen, { key, value, notes = [], mark }: Fact, width: number): Block {
  const valueStyle: TextStyle = mark ? { ...styles.value, colour: markColour(mark) } : styles.value;
  const room = mark ? 11 : 0;
  const body = paragraph(pen, value, width - room, valueStyle);
  const marked: Block = {
    height: body.height,
    draw(x, y) {
      if (mark) drawMark(pen, mark, x, y + 2.4, 7.2);
      body.draw(x + room, y);
    },
  };
  const small = notes.filter((note) => note !== "").map((note) => paragraph(pen, note, width, styles.note));
  return stack([paragraph(pen, key, width, styles.key), marked, ...small]);
}

/** Framed cells in rows, as on a drawing's title block. Widths are shares of the row. */
export function titleBlock(pen: Pen, rows: readonly { fact: Fact; share: number }[][], width: number): Block {
  const blocks = rows.map((cells) => rowOfCells(pen, cells, width));
  const whole = stack(blocks);
  return {
    height: whole.height,
    draw(x, y) {
      whole.draw(x, y);
      let top = y;
      for (const { height } of blocks.slice(0, -1)) {
        top += height;
        line(pen, [x, top], [x + width, top], { colour: colours.hair2 });
      }
      frame(pen, [x, y, width, whole.height]);
    },
  };
}

function rowOfCells(pen: Pen, cells: readonly { fact: Fact; share: number }[], width: number): Block {
  const shares = cells.reduce((sum, { share }) => sum + share, 0);
  let from = 0;
  const parts = cells.map(({ fact, share }) => {
    const own = (width * share) / shares;
    const part = { at: from, block: factBlock(pen, fact, own - 2 * inner.x) };
    from += own;
    return part;
  });
  const row = beside(parts.map(({ at, block }) => ({ at: at + inner.x, block })));
  const height = row.height + 2 * inner.y;
  return {
    height,
    draw(x, y) {
      row.draw(x, y + inner.y);
      for (const { at } of parts.slice(1))
        line(pen, [x + at, y], [x + at, y + height], { colour: colours.hair2 });
    },
  };
}

/** Keys at the left, values at the right end, as a list of conditions. */
export function factList(pen: Pen, facts: readonly (readonly [string, string])[], width: number): Block {
  const rows = facts.map(([key, value]) => {
    const keyWidth = pen.measure(key, styles.body);
    const lines = pen.wrap(value, width - keyWidth - 8, styles.bodyStrong);
    return { key, lines };
  });
  const leading = 12.4;
  return {
    height: rows.reduce((sum, { lines }) => sum + lines.length * leading, 0),
    draw(x, y) {
      let baseline = y + 9;
      for (const { key, lines } of rows) {
        pen.write(key, x, baseline, { ...styles.body, colour: colours.ink2 });
        for (const text of lines) {
          pen.write(text, x + width, baseline, styles.bodyStrong, "right");
          baseline += leading;
        }
      }
    },
  };
}
