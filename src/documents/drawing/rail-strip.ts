import "server-only";
import { type RailStripBar, type RailStripInput, railStrip } from "../../format/picture/rail-strip";
import type { Block } from "./block";
import { box, line } from "./lines";
import type { Pen } from "./pen";
import { colours, styles } from "./print-style";

/** The product's own picture, from the geometry that the page draws from as well. */
export function railStripBlock(pen: Pen, input: Omit<RailStripInput, "railHeight" | "showLabels">): Block {
  const picture = railStrip({ ...input, railHeight: 3, showLabels: true });
  const { width, height, meanY, limits, injectors, labelY } = picture;
  return {
    height,
    draw(x, y) {
      box(pen, [x, y, width, picture.rail.height], colours.ink);
      for (const { stem, x: at } of injectors)
        line(pen, [x + at, y + stem.y1], [x + at, y + stem.y2], { colour: colours.hair });
      for (const { found } of injectors) if (found) drawBar(pen, found, x, y, colours.found);
      for (const limit of limits ? [limits.highY, limits.lowY] : [])
        line(pen, [x, y + limit], [x + width, y + limit], { colour: colours.ink2, dash: 1.5 });
      line(pen, [x, y + meanY], [x + width, y + meanY], { colour: colours.ink, width: 0.7 });
      for (const { left } of injectors)
        if (left) drawBar(pen, left, x, y, left.outside ? colours.out : colours.petrol);
      for (const { label, x: at } of injectors) pen.write(label, x + at, y + labelY!, styles.axis, "centre");
    },
  };
}

/** A bar that was cut ends in a gap, so that its length is not taken for its deviation. */
function drawBar(pen: Pen, bar: RailStripBar, x: number, y: number, colour: string): void {
  box(pen, [x + bar.x, y + bar.y, bar.width, bar.height], colour);
  if (!bar.clipped) return;
  const at = bar.clipped === "high" ? y + bar.y + 3 : y + bar.y + bar.height - 4.5;
  box(pen, [x + bar.x - 1, at, bar.width + 2, 1.5], colours.paper);
}
