import "server-only";
import type { Weight } from "./font-files";

/** The colours of the application's light sheet, darkened where paper needs it; all are told apart in grey as well. */
export const colours = {
  ink: "#13202b",
  ink2: "#4d5d6b",
  hair: "#b9c4cc",
  hair2: "#dbe2e7",
  paper: "#ffffff",
  petrol: "#0a6581",
  petrolSoft: "#e3eff3",
  out: "#b23a16",
  held: "#7d5100",
  found: "#b4c2cc",
} as const;

export type TextStyle = { size: number; weight: Weight; colour: string };

const style = (size: number, weight: Weight = 400, colour: string = colours.ink): TextStyle => ({
  size,
  weight,
  colour,
});

export const styles = {
  title: style(17, 600),
  number: style(12, 600),
  heading: style(9.5, 600),
  note: style(7.2, 400, colours.ink2),
  key: style(6.8, 400, colours.ink2),
  value: style(8.6, 500),
  body: style(8.2),
  bodyStrong: style(8.2, 500),
  figure: style(8.2, 500),
  found: style(7.4, 400, colours.ink2),
  small: style(7, 400, colours.ink2),
  axis: style(6.4, 400, colours.ink2),
} as const satisfies Record<string, TextStyle>;

/** Room for a line of text of this size, from one line to the next. */
export function leadingOf({ size }: TextStyle): number {
  return size * 1.3;
}

/** Millimetres into points. */
export function mm(millimetres: number): number {
  return (millimetres * 72) / 25.4;
}
