import "server-only";
import { line } from "./lines";
import type { Pen } from "./pen";
import { colours, styles } from "./print-style";

export type Scale = (value: number) => number;
export type Tick = { value: number; label: string };
export type Plot = { left: number; top: number; width: number; height: number; x: Scale; y: Scale };

type Input = { left: number; top: number; width: number; height: number };
type Extent = { low: number; high: number; logarithmic?: boolean };

/** A field to plot in, in the coordinates of the page; y runs upwards. */
export function openPlot({ left, top, width, height }: Input, xs: Extent, ys: Extent): Plot {
  const x = share(xs);
  const y = share(ys);
  return {
    left,
    top,
    width,
    height,
    x: (value) => left + x(value) * width,
    y: (value) => top + (1 - y(value)) * height,
  };
}

function share({ low, high, logarithmic }: Extent): Scale {
  const bend = logarithmic ? Math.log : (value: number) => value;
  return (value) => (bend(value) - bend(low)) / (bend(high) - bend(low));
}

/** Hairlines across at each y tick, figures at both axes. */
export function drawAxes(pen: Pen, plot: Plot, xTicks: readonly Tick[], yTicks: readonly Tick[]): void {
  const bottom = plot.top + plot.height;
  for (const { value, label } of yTicks) {
    const y = plot.y(value);
    line(pen, [plot.left, y], [plot.left + plot.width, y], { colour: colours.hair2 });
    pen.write(label, plot.left - 5, y + 2.2, styles.axis, "right");
  }
  for (const { value, label } of xTicks) {
    line(pen, [plot.x(value), bottom], [plot.x(value), bottom + 2.5]);
    pen.write(label, plot.x(value), bottom + 10, styles.axis, "centre");
  }
}

export function polyline(
  { doc }: Pen,
  points: readonly (readonly [number, number])[],
  { colour, width, dash }: { colour: string; width: number; dash?: number },
): void {
  if (points.length < 2) return;
  doc.lineWidth(width).strokeColor(colour);
  if (dash) doc.dash(dash, { space: dash });
  for (const [index, [x, y]] of points.entries())
    if (index === 0) doc.moveTo(x, y);
    else doc.lineTo(x, y);
  doc.stroke();
  if (dash) doc.undash();
}
