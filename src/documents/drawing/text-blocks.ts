import "server-only";
import type { Block } from "./block";
import type { Pen } from "./pen";
import { leadingOf, styles, type TextStyle } from "./print-style";

/** Capitals reach 0.698 of the size: so they stand in the middle of the line's room. */
const middleOfCapitals = 0.349;

export function baselineOf(y: number, style: TextStyle): number {
  return y + leadingOf(style) / 2 + middleOfCapitals * style.size;
}

/** One block per line, so that a paragraph may run on over a page. */
export function linesOf(pen: Pen, text: string, width: number, style: TextStyle): Block[] {
  return pen.wrap(text, width, style).map((line) => ({
    height: leadingOf(style),
    draw: (x, y) => pen.write(line, x, baselineOf(y, style), style),
  }));
}

export function paragraph(pen: Pen, text: string, width: number, style: TextStyle): Block {
  const lines = pen.wrap(text, width, style);
  const leading = leadingOf(style);
  return {
    height: lines.length * leading,
    draw(x, y) {
      for (const [index, line] of lines.entries())
        pen.write(line, x, baselineOf(y + index * leading, style), style);
    },
  };
}

/** A heading with a quieter note behind it, or below where the line is full. */
export function heading(pen: Pen, title: string, note: string, width: number): Block {
  const { heading: big, note: small } = styles;
  const after = pen.measure(title, big) + 8;
  const inLine = note !== "" && after + pen.measure(note, small) <= width;
  const below = note !== "" && !inLine ? paragraph(pen, note, width, small) : null;
  const lineHeight = leadingOf(big) + 2;
  return {
    height: lineHeight + (below?.height ?? 0) + 3,
    draw(x, y) {
      const baseline = baselineOf(y, big);
      pen.write(title, x, baseline, big);
      if (inLine) pen.write(note, x + after, baseline, small);
      below?.draw(x, y + lineHeight);
    },
  };
}
