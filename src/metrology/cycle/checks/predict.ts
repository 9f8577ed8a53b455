import { fitFlowLine } from "../../line/fit-flow-line";
import { fitLine, type LineFit } from "../../line/fit-line";
import type { Column, Grid, Row } from "./grid";
import { medianOf } from "./median-of";
import { thresholds } from "./thresholds";

/** What the other readings say a reading should be, and how far off it still is explained. */
export type Prediction = {
  flow: number;
  /** Standard uncertainty of a single reading against the prediction. */
  u: number;
  /** Deviation that is explained, in the unit of the flow. */
  explained: number;
  /** How badly the readings that predict agree among themselves: weighted sum of squares. */
  misfit: number;
  /** How many readings predict. */
  support: number;
};

/** What a row's flows are laid against: the median flows of the others, or, with too few others, the pulse widths. */
export type Abscissa = { by: "set" | "width"; at: Map<number, number>; others: number };

/**
 * The median flow of the other injectors at each width carries whatever bends their lines at short pulses, so that an
 * injector's own flows are straight against it over all widths.
 */
export function abscissaOf(grid: Grid, row: Row): Abscissa {
  const widths = grid.widths.filter((width) => row.cells.has(width));
  const others = grid.rows.filter(
    (other) => other !== row && widths.every((width) => other.cells.has(width)),
  );
  if (others.length < thresholds.othersForCurve)
    return { by: "width", at: new Map(widths.map((width) => [width, width])), others: 0 };
  const median = (width: number) => medianOf(others.map((other) => other.cells.get(width)!.flow));
  return { by: "set", at: new Map(widths.map((width) => [width, median(width)])), others: others.length };
}

/** Prediction at one width from the row's widths in `from`, that width left out; null where nothing can be said. */
export function predictAt(
  row: Row,
  abscissa: Abscissa,
  width: number,
  from: readonly number[],
): Prediction | null {
  const points = from.filter((other) => other !== width).map((other) => pointOf(row, abscissa, other));
  const x = abscissa.at.get(width);
  const cell = row.cells.get(width);
  if (points.length < 3 || x === undefined || !cell) return null;
  try {
    const line = abscissa.by === "set" ? fitLine(points) : lineBelow(points, width);
    return line && fromLine(line, x, cell.u, abscissa);
  } catch (error) {
    if (error instanceof RangeError) return null;
    throw error;
  }
}

function pointOf(row: Row, { at, others }: Abscissa, width: number) {
  const { flow, u } = row.cells.get(width)!;
  // A median of n values is less certain than their mean: its variance is π/2 times as large.
  const byMedian = others > 0 ? Math.PI / 2 / others : 0;
  const least = Number.MIN_VALUE ** 0.25;
  return {
    x: at.get(width)!,
    y: flow,
    u: Math.max(least, Math.hypot(u * Math.sqrt(1 + byMedian), thresholds.character * flow)),
  };
}

/** A straight line of its own says nothing at or below the start of its linear range. */
function lineBelow(points: { x: number; y: number; u: number }[], width: number): LineFit | null {
  const { line, linearRange } = fitFlowLine(
    points.map(({ x, y, u }) => ({ pulseWidthMs: x, volumePerPulseUl: y, u })),
  );
  return width > linearRange.fromMs ? line : null;
}

function fromLine(line: LineFit, x: number, ofReading: number, { by }: Abscissa): Prediction | null {
  const { slope, intercept, slopeSe, interceptSe, covariance, residualSd, degreesOfFreedom } = line;
  const flow = intercept + slope * x;
  if (!(flow > 0) || slopeSe === null || interceptSe === null || covariance === null) return null;
  const ofLine = Math.max(0, interceptSe ** 2 + 2 * x * covariance + (x * slopeSe) ** 2);
  const u = Math.sqrt(ofReading ** 2 + ofLine + (thresholds.character * flow) ** 2);
  const floor = (by === "set" ? thresholds.floorBySet : thresholds.floorByLine) * flow;
  return {
    flow,
    u,
    explained: Math.max(floor, thresholds.coverage * u),
    misfit: (residualSd ?? 0) ** 2 * degreesOfFreedom,
    support: degreesOfFreedom + 2,
  };
}

/** Held open: the row's own line, less what the others show between line and held open. */
export function predictHeldOpen(grid: Grid, row: Row): Prediction | null {
  const cell = row.cells.get(null);
  const { staticFlow, staticFlowOwnU } = row.figures;
  const closures = grid.rows.flatMap((other) =>
    other === row || other.figures.closurePercent === null ? [] : [other.figures.closurePercent],
  );
  if (!cell || !staticFlow || staticFlowOwnU === null || closures.length < thresholds.othersForCurve)
    return null;
  const flow = staticFlow.value / (1 + medianOf(closures) / 100);
  if (!(flow > 0)) return null;
  const u = Math.hypot(cell.u, staticFlowOwnU, 2 * thresholds.character * flow);
  const explained = Math.max(thresholds.floorBySet * flow, thresholds.coverage * u);
  return { flow, u, explained, misfit: 0, support: 0 };
}

/** Predictions of all rows in one column, each from its sound widths. */
export function predictColumn(
  grid: Grid,
  column: Column,
  soundWidths: Map<Row, number[]>,
): Map<Row, Prediction> {
  const predictions = new Map<Row, Prediction>();
  for (const row of grid.rows) {
    const prediction =
      column === null
        ? predictHeldOpen(grid, row)
        : predictAt(row, abscissaOf(grid, row), column, soundWidths.get(row) ?? []);
    if (prediction && row.cells.has(column)) predictions.set(row, prediction);
  }
  return predictions;
}
