import "server-only";
import { type Block, gap, inset, nothing } from "../../drawing/block";
import { box } from "../../drawing/lines";
import type { Pen } from "../../drawing/pen";
import { colours, styles, type TextStyle } from "../../drawing/print-style";
import type { Section } from "../../drawing/sheet";
import { heading, linesOf } from "../../drawing/text-blocks";

/** Paragraphs that may run on over pages, line by line. */
export function textSection(
  pen: Pen,
  paragraphs: readonly string[],
  width: number,
  style: TextStyle = styles.body,
): Section {
  const rows = paragraphs.flatMap((text, index) => {
    const lines = linesOf(pen, text, width, style);
    return index === 0 ? lines : [gap(3), ...lines];
  });
  return { lead: nothing, rows };
}

export function titledText(
  pen: Pen,
  title: string,
  paragraphs: readonly string[],
  width: number,
  note = "",
): Section {
  return { ...textSection(pen, paragraphs, width), lead: heading(pen, title, note, width) };
}

/** Somebody's own words, with a bar along them, so that they are not taken for the laboratory's. */
export function quotedText(
  pen: Pen,
  { title, note }: { title: string; note: string },
  parts: readonly { label: string; text: string }[],
  width: number,
): Section {
  const rows = parts.flatMap(({ label, text }) => [
    ...linesOf(pen, label, width - 12, styles.key),
    ...linesOf(pen, text, width - 12, styles.body),
    gap(2),
  ]);
  return { lead: heading(pen, title, note, width), rows: rows.map((row) => barred(pen, row)) };
}

function barred(pen: Pen, block: Block): Block {
  const { height, draw } = inset(block, { left: 10 });
  return {
    height,
    draw(x, y) {
      box(pen, [x, y, 1.5, height], colours.found);
      draw(x, y);
    },
  };
}
