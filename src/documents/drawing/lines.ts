import "server-only";
import type { Pen } from "./pen";
import { colours } from "./print-style";

type Stroke = { colour?: string; width?: number; dash?: number };

export function line(
  { doc }: Pen,
  [x1, y1]: readonly [number, number],
  [x2, y2]: readonly [number, number],
  { colour = colours.hair, width = 0.5, dash }: Stroke = {},
): void {
  doc.lineWidth(width).strokeColor(colour);
  if (dash) doc.dash(dash, { space: dash });
  doc.moveTo(x1, y1).lineTo(x2, y2).stroke();
  if (dash) doc.undash();
}

export function box(
  { doc }: Pen,
  [x, y, width, height]: readonly [number, number, number, number],
  colour: string,
): void {
  doc.rect(x, y, width, height).fill(colour);
}

export function frame(
  { doc }: Pen,
  [x, y, width, height]: readonly [number, number, number, number],
  { colour = colours.hair, width: stroke = 0.5 }: Stroke = {},
): void {
  doc.lineWidth(stroke).strokeColor(colour).roundedRect(x, y, width, height, 1.5).stroke();
}
