import "server-only";
import { formatQuantity } from "../../../format/format-number";
import { niceTicks } from "../../../format/picture/nice-ticks";
import { drawAxes, openPlot, type Plot, polyline } from "../../drawing/axes";
import { type Block, stack } from "../../drawing/block";
import { line } from "../../drawing/lines";
import type { Pen } from "../../drawing/pen";
import { colours, styles } from "../../drawing/print-style";
import { heading } from "../../drawing/text-blocks";
import type { CertificateContent, CertifiedPhase } from "../content";
import { isInLinearRange, measuredWidths } from "../reading-content";
import { widthTicks } from "./width-ticks";

const height = 136;

/** Flow per pulse against pulse width: each injector's line, and the set's mean at each width. */
export function flowLinePicture(pen: Pen, content: CertificateContent, width: number): Block {
  const title = heading(pen, "Flow line", "µL per pulse against pulse width, as found pale", width);
  return stack([title, { height, draw: (x, y) => draw(pen, content, [x, y, width]) }]);
}

function draw(pen: Pen, content: CertificateContent, [x, y, width]: [number, number, number]): void {
  const { asFound, asLeft } = content;
  const longest = measuredWidths(content).at(-1) ?? 1;
  const xTicks = niceTicks(0, longest, 5);
  const yTicks = niceTicks(0, largestFlow(content), 4);
  const plot = openPlot(
    { left: x + 28, top: y + 10, width: width - 34, height: height - 26 },
    { low: 0, high: Math.max(longest, xTicks.at(-1)!) },
    { low: 0, high: yTicks.at(-1)! },
  );
  drawAxes(
    pen,
    plot,
    widthTicks(xTicks),
    yTicks.map((value) => ({ value, label: String(value) })),
  );
  pen.write("µL", plot.left - 5, y + 4, styles.axis, "right");
  drawLines(pen, plot, asFound, longest, { colour: colours.found, width: 0.6 });
  drawLines(pen, plot, asLeft, longest, { colour: colours.petrol, width: 0.7 });
  drawMeans(pen, plot, asLeft, content);
  markDeadTime(pen, plot, asLeft);
}

function largestFlow({ asFound, asLeft }: CertificateContent): number {
  const flows = [asFound, asLeft].flatMap(({ figures }) => figures.injectors.flatMap(({ flows }) => flows));
  return Math.max(1e-3, ...flows.map(({ volumePerPulseUl }) => volumePerPulseUl));
}

function drawLines(
  pen: Pen,
  plot: Plot,
  { figures }: CertifiedPhase,
  longest: number,
  stroke: { colour: string; width: number },
): void {
  for (const { flowLine } of figures.injectors) {
    if (!flowLine) continue;
    const { slopeUlPerMs, deadTimeMs } = flowLine;
    const from = Math.max(0, deadTimeMs);
    const at = (width: number) => [plot.x(width), plot.y(slopeUlPerMs * (width - deadTimeMs))] as const;
    polyline(pen, [at(from), at(longest)], stroke);
  }
}

/** Full where every injector's point lies in its linear range, hollow where one does not. */
function drawMeans(pen: Pen, plot: Plot, phase: CertifiedPhase, content: CertificateContent): void {
  const { injectors } = phase.figures;
  for (const pulseWidthMs of measuredWidths(content)) {
    const flows = injectors.flatMap((injector) =>
      injector.flows.filter((flow) => flow.pulseWidthMs === pulseWidthMs),
    );
    if (flows.length === 0) continue;
    const mean = flows.reduce((sum, flow) => sum + flow.volumePerPulseUl, 0) / flows.length;
    const linear = injectors.every(({ flowLine }) => isInLinearRange(flowLine, pulseWidthMs));
    pen.doc.lineWidth(0.8).circle(plot.x(pulseWidthMs), plot.y(mean), 1.9);
    pen.doc.fillAndStroke(linear ? colours.petrol : colours.paper, colours.petrol);
  }
}

function markDeadTime(pen: Pen, plot: Plot, { figures }: CertifiedPhase): void {
  const times = figures.injectors.flatMap(({ flowLine }) =>
    flowLine?.deadTimeInterval ? [flowLine.deadTimeMs] : [],
  );
  if (times.length === 0) return;
  const mean = times.reduce((sum, value) => sum + value, 0) / times.length;
  const x = plot.x(mean);
  const top = plot.top + plot.height * 0.2;
  line(pen, [x, plot.top + plot.height], [x, top], { colour: colours.ink, width: 0.7 });
  const label = times.length > 1 ? "mean dead time" : "dead time";
  pen.write(`${label} ${formatQuantity(mean, "deadTime")}`, plot.left + 3, top - 3, styles.axis);
}
