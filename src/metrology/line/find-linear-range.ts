import { fitLine } from "./fit-line";
import { asPoint, type FlowPoint } from "./flow-point";
import { type Columns, readPoints } from "./read-points";

type Rule = { maxDeviationPercent: number; minWidths: number };
/** Indices of distinct widths, both included. */
type Run = { from: number; to: number; ratio: number };
/** Readings in rising order of width; the readings of width k are those from starts[k] up to starts[k + 1]. */
type Readings = Columns & { widths: number[]; starts: number[]; points: FlowPoint[] };

/** Rounding alone must not make one ratio larger than another. */
const sameRatio = 1e-12;

/**
 * Searches all contiguous runs of distinct pulse widths for the widest one that a line of its own holds; see
 * `fitFlowLine`. Lines of runs with the same start are made by adding one reading after the other (running means and
 * centred sums), and no run that could not win is looked at reading by reading.
 * @throws RangeError when there are too few widths or no run holds.
 */
export function findLinearRange(points: readonly FlowPoint[], rule: Rule): { fromMs: number; toMs: number } {
  const readings = inRisingOrder(points);
  const { widths } = readings;
  if (widths.length < rule.minWidths)
    throw new RangeError(
      `points must have at least ${rule.minWidths} different pulse widths for a line: ${widths.length} were given`,
    );
  let best: Run | null = null;
  for (let from = 0; from + rule.minWidths <= widths.length; from++) {
    const run = widestFrom(readings, from, rule, best);
    if (run && (!best || isBetter(readings, run, best))) best = run;
  }
  if (!best)
    throw new RangeError(
      `points must have ${rule.minWidths} neighbouring pulse widths within ±${rule.maxDeviationPercent} % of a rising line: none were given`,
    );
  return { fromMs: widths[best.from]!, toMs: widths[best.to]! };
}

function inRisingOrder(points: readonly FlowPoint[]): Readings {
  const sorted = [...points].sort((a, b) => a.pulseWidthMs - b.pulseWidthMs);
  const columns = readPoints(sorted.map(asPoint), 0);
  const widths: number[] = [];
  const starts: number[] = [];
  columns.xs.forEach((x, index) => {
    if (x === widths.at(-1)) return;
    widths.push(x);
    starts.push(index);
  });
  return { ...columns, widths, starts: [...starts, sorted.length], points: sorted };
}

function widestFrom(readings: Readings, from: number, rule: Rule, best: Run | null): Run | null {
  const { widths, starts } = readings;
  const ratioTo = (to: number) => widths[to]! / widths[from]!;
  const shortest = from + rule.minWidths - 1;
  const couldWin = (to: number) => !best || ratioTo(to) >= best.ratio * (1 - sameRatio);
  if (!couldWin(widths.length - 1)) return null;
  const lines = growingLines(readings, from);
  for (let to = widths.length - 1; to >= shortest && couldWin(to); to--)
    if (holds(readings, starts[from]!, starts[to + 1]!, lines[to]!, rule.maxDeviationPercent / 100))
      return { from, to, ratio: ratioTo(to) };
  return null;
}

type CentredLine = { x: number; y: number; slope: number };

/** The lines of all runs that start at `from`, by their last width. Update of West, Comm. ACM 22 (1979) 532-535. */
function growingLines({ xs, ys, weights, widths, starts }: Readings, from: number): CentredLine[] {
  const lines: CentredLine[] = [];
  let [weight, x, y, sxx, sxy] = [0, 0, 0, 0, 0];
  for (let to = from; to < widths.length; to++) {
    for (let i = starts[to]!; i < starts[to + 1]!; i++) {
      weight += weights[i]!;
      const share = weights[i]! / weight;
      const dx = xs[i]! - x;
      x += share * dx;
      y += share * (ys[i]! - y);
      sxx += weights[i]! * dx * (xs[i]! - x);
      sxy += weights[i]! * dx * (ys[i]! - y);
    }
    lines[to] = { x, y, slope: sxy / sxx };
  }
  return lines;
}

function holds({ xs, ys }: Readings, first: number, end: number, line: CentredLine, share: number): boolean {
  if (!(line.slope > 0)) return false;
  for (let i = first; i < end; i++) {
    const predicted = line.y + line.slope * (xs[i]! - line.x);
    if (!(predicted > 0 && Math.abs(ys[i]! - predicted) <= share * predicted)) return false;
  }
  return true;
}

function isBetter(readings: Readings, run: Run, best: Run): boolean {
  if (run.ratio > best.ratio * (1 + sameRatio)) return true;
  if (run.ratio < best.ratio * (1 - sameRatio)) return false;
  const within = ({ from, to }: Run) => readings.points.slice(readings.starts[from], readings.starts[to + 1]);
  const [mine, other] = [within(run), within(best)];
  if (mine.length !== other.length) return mine.length > other.length;
  const scatter = (points: FlowPoint[]) => fitLine(points.map(asPoint)).residualSd ?? 0;
  return scatter(mine) < scatter(other);
}
