import type { ShiftedColumn } from "../doubt";
import type { Column, Grid, Row } from "./grid";
import type { Prediction } from "./predict";
import { thresholds } from "./thresholds";

/** Whether a column agrees with the lines once every reading is moved to the injector before or after. */
export function findShiftedColumn(
  grid: Grid,
  column: Column,
  predictions: Map<Row, Prediction>,
): ShiftedColumn | null {
  const asRead = rootMeanSquares(grid, column, predictions, 0);
  const { least, coverage, left } = thresholds.shift;
  if (!asRead || asRead.count < 4 || asRead.share < Math.max(least, coverage * asRead.u)) return null;
  // One reading that is wrong by itself explains more simply what a shift would only push out of the column.
  if (asRead.shareWithoutWorst <= left * asRead.share) return null;
  const found = ([1, -1] as const).flatMap((shift) => {
    const shifted = rootMeanSquares(grid, column, predictions, shift);
    if (!shifted || shifted.count < 3 || shifted.share > left * asRead.share) return [];
    return [{ shift, share: shifted.share }];
  });
  const [best] = found.sort((a, b) => a.share - b.share);
  if (!best) return null;
  return {
    kind: "column shifted by an injector",
    injectorId: null,
    pulseWidthMs: column,
    shift: best.shift,
    deviationPercent: 100 * asRead.share,
    shiftedPercent: 100 * best.share,
  };
}

/** Deviations of readings from the prediction of the injector they may belong to, `shift` rows before, as a share. */
function rootMeanSquares(grid: Grid, column: Column, predictions: Map<Row, Prediction>, shift: 0 | 1 | -1) {
  let [count, squares, worst, variance] = [0, 0, 0, 0];
  grid.rows.forEach((row, index) => {
    const owner = grid.rows[index - shift];
    const prediction = owner && predictions.get(owner);
    const [read, place] = [row.cells.get(column), owner?.cells.get(column)];
    if (!prediction || !read || !place) return;
    count += 1;
    const square = ((place.flowOf(read.amount) - prediction.flow) / prediction.flow) ** 2;
    squares += square;
    worst = Math.max(worst, square);
    variance += (prediction.u / prediction.flow) ** 2;
  });
  if (count === 0) return null;
  return {
    count,
    share: Math.sqrt(squares / count),
    shareWithoutWorst: Math.sqrt(Math.max(0, squares - worst) / Math.max(1, count - 1)),
    u: Math.sqrt(variance / count),
  };
}
