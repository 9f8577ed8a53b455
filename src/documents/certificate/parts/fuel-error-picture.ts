import "server-only";
import { niceTicks } from "../../../format/picture/nice-ticks";
import { spreadLabels } from "../../../format/picture/spread-labels";
import { drawAxes, openPlot, type Plot, polyline, type Tick } from "../../drawing/axes";
import { type Block, stack } from "../../drawing/block";
import { box, line } from "../../drawing/lines";
import type { Pen } from "../../drawing/pen";
import { colours, styles } from "../../drawing/print-style";
import { heading } from "../../drawing/text-blocks";
import type { CertificateContent, FuelError } from "../content";
import { placeOf } from "../reading-content";
import { widthTicks } from "./width-ticks";

const height = 136;
/** Pulse widths of an idling engine; common practice, no source. */
const idle = { fromMs: 2.5, toMs: 4 };
const usualWidths = [0.5, 1, 1.5, 2, 3, 4, 6, 8, 10, 12, 16, 20, 30, 50];
const labelGap = 6.6;

/** Each injector's percent error from the set's mean fuel: a small mismatch of dead times shows at short pulses. */
export function fuelErrorPicture(pen: Pen, content: CertificateContent, width: number): Block {
  const { fuelError } = content.asLeft;
  const title = heading(
    pen,
    "Fuel error",
    "each injector against the set's mean, by pulse width, as left",
    width,
  );
  const picture: Block =
    fuelError.pulseWidthsMs.length > 1
      ? { height, draw: (x, y) => draw(pen, content, fuelError, [x, y, width]) }
      : {
          height: 20,
          draw: (x, y) => pen.write("Needs two injectors with a flow line.", x, y + 10, styles.note),
        };
  return stack([title, picture]);
}

function draw(
  pen: Pen,
  content: CertificateContent,
  fuelError: FuelError,
  [x, y, width]: [number, number, number],
): void {
  const { pulseWidthsMs, injectors } = fuelError;
  const from = pulseWidthsMs[0]!;
  const to = pulseWidthsMs.at(-1)!;
  const largest = Math.max(0.5, ...injectors.flatMap(({ errorPercent }) => errorPercent.map(Math.abs)));
  const yTicks = niceTicks(-largest, largest, 4);
  const plot = openPlot(
    { left: x + 28, top: y + 10, width: width - 50, height: height - 26 },
    { low: from, high: to, logarithmic: true },
    { low: yTicks[0]!, high: yTicks.at(-1)! },
  );
  drawIdleBand(pen, plot, from, to);
  drawAxes(pen, plot, widthTicks(inRange(from, to)), yTicks.map(percentTick));
  pen.write("%", plot.left - 5, y + 4, styles.axis, "right");
  line(pen, [plot.left, plot.y(0)], [plot.left + plot.width, plot.y(0)], { colour: colours.ink, width: 0.7 });
  for (const { errorPercent } of injectors)
    polyline(
      pen,
      errorPercent.map((percent, index) => [plot.x(pulseWidthsMs[index]!), plot.y(percent)]),
      { colour: colours.petrol, width: 0.7 },
    );
  drawLabels(pen, plot, content, fuelError);
}

function percentTick(value: number): Tick {
  const label = value > 0 ? `+${value}` : String(value).replace("-", "\u2212");
  return { value, label };
}

function inRange(from: number, to: number): number[] {
  return usualWidths.filter((width) => width >= from && width <= to);
}

function drawIdleBand(pen: Pen, plot: Plot, from: number, to: number): void {
  const left = Math.max(idle.fromMs, from);
  const right = Math.min(idle.toMs, to);
  if (left >= right) return;
  box(pen, [plot.x(left), plot.top, plot.x(right) - plot.x(left), plot.height], colours.petrolSoft);
  pen.write("idle", (plot.x(left) + plot.x(right)) / 2, plot.top + 8, styles.axis, "centre");
}

/** Numbers at the right ends, moved apart; of a large set only the outermost, which is where they are read. */
function drawLabels(
  pen: Pen,
  plot: Plot,
  { injectors }: CertificateContent,
  { injectors: curves }: FuelError,
): void {
  const ends = curves
    .map(({ injectorId, errorPercent }) => ({ injectorId, y: plot.y(errorPercent.at(-1)!) }))
    .sort((one, other) => one.y - other.y);
  const most = Math.floor(plot.height / labelGap);
  const shown = ends.length > most ? [...ends.slice(0, 3), ...ends.slice(-3)] : ends;
  const right = plot.left + plot.width;
  const placed = spreadLabels(
    shown.map(({ injectorId, y }) => ({ label: injectorId, y })),
    { gap: labelGap, low: plot.top, high: plot.top + plot.height },
  );
  for (const { label, wantedY, y } of placed) {
    const injector = injectors.find(({ injectorId }) => injectorId === label);
    line(pen, [right, wantedY], [right + 6, y], { colour: colours.hair });
    pen.write(injector ? placeOf(injector) : "", right + 8, y + 2.2, styles.axis);
  }
}
