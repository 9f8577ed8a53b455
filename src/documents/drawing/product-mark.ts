import "server-only";
import type { Pen } from "./pen";
import { colours } from "./print-style";

/** A rail with evenly hanging bars, 26 by 20 units. */
export function drawProductMark({ doc }: Pen, x: number, y: number, width: number): void {
  const unit = width / 26;
  doc.roundedRect(x, y + unit, width, 3.4 * unit, 1.7 * unit).fill(colours.ink);
  for (const from of [1.9, 7.9, 13.9, 19.9])
    doc.roundedRect(x + from * unit, y + 6.4 * unit, 4 * unit, 11 * unit, unit).fill(colours.petrol);
}
