import "server-only";
import type { Pen } from "./pen";
import { colours } from "./print-style";

/** The same shapes as on the page: disc and square, full and hollow, and a dash. They hold in grey. */
export type MarkKind = "pass" | "conditional pass" | "conditional fail" | "fail" | "none";

const markColours: Record<MarkKind, string> = {
  pass: colours.petrol,
  "conditional pass": colours.petrol,
  "conditional fail": colours.out,
  fail: colours.out,
  none: colours.ink2,
};

export function markColour(kind: MarkKind): string {
  return markColours[kind];
}

/** Within a square of the size given, its upper left corner at x, y. */
export function drawMark({ doc }: Pen, kind: MarkKind, x: number, y: number, size: number): void {
  const stroke = size * 0.16;
  const half = size / 2;
  doc.lineWidth(stroke).strokeColor(markColours[kind]).fillColor(markColours[kind]);
  if (kind === "pass") doc.circle(x + half, y + half, half).fill();
  else if (kind === "conditional pass") doc.circle(x + half, y + half, half - stroke / 2).stroke();
  else if (kind === "fail") doc.rect(x + size * 0.06, y + size * 0.06, size * 0.88, size * 0.88).fill();
  else if (kind === "conditional fail")
    doc.rect(x + stroke / 2, y + stroke / 2, size - stroke, size - stroke).stroke();
  else doc.rect(x, y + half - stroke / 2, size, stroke).fill();
}
