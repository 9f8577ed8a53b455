import { findClosureOver5, findDutyOver100, findOutsideTheBand } from "./checks/against-record";
import { findColumnsOfAnotherWidth } from "./checks/column-of-another-width";
import { findExchangedInColumn } from "./checks/exchanged-in-column";
import { findExchangedInCycle } from "./checks/exchanged-in-cycle";
import { type Column, type Grid, layOutGrid, type Row } from "./checks/grid";
import { findNotRising } from "./checks/not-rising";
import { findOffTheLine } from "./checks/off-the-line";
import { findOutliersAtWidths } from "./checks/outlier-at-width";
import { predictColumn } from "./checks/predict";
import { findShiftedColumn } from "./checks/shifted-column";
import type { CheckAgainst, Doubt, OffTheLine } from "./doubt";
import type { CycleFigures, CycleInput } from "./types";

/**
 * The readings of a cycle that are in doubt, each with the numbers that make it so: off the line, not rising with pulse
 * width, duty over 100 %, outside the model's band, outlier at a width, closure over 5 %, two injectors exchanged in a
 * column or in the whole cycle, a column shifted by an injector or taken from another width.
 *
 * `figures` are those of the same input. What one slip explains is named once: a shifted or exchanged column is not also a
 * dozen readings off their lines. Nothing is changed or left out on account of a doubt. Injectors whose flows are nearly
 * equal cannot be told apart, so exchanging them goes unseen.
 *
 * Units: ms, µL per pulse, mL/min, %. Throws RangeError for conditions as `evaluateCycle` does, never for readings.
 * Source: deletion residuals and the median of the set as reference are textbook; the thresholds are common practice, no source.
 */
export function checkReadings(
  input: CycleInput,
  figures: CycleFigures,
  { model, earlier }: CheckAgainst = {},
): Doubt[] {
  const grid = layOutGrid(input, figures);
  const offTheLine = grid.rows.flatMap((row) => findOffTheLine(grid, row));
  const columns = findInColumns(grid, offTheLine);
  const isInDoubt = (injectorId: string, width: Column) =>
    columns.some((doubt) => covers(doubt, injectorId, width)) ||
    offTheLine.some((doubt) => covers(doubt, injectorId, width));
  const notRising = grid.rows
    .flatMap(findNotRising)
    .filter(
      ({ injectorId, pulseWidthMs, shorterPulseWidthMs }) =>
        !isInDoubt(injectorId, pulseWidthMs) && !isInDoubt(injectorId, shorterPulseWidthMs),
    );
  return [
    ...findDutyOver100(figures, input),
    ...columns,
    ...offTheLine.filter(
      (doubt) => !columns.some((column) => covers(column, doubt.injectorId, doubt.pulseWidthMs)),
    ),
    ...notRising,
    ...findOutliersAtWidths(grid, isInDoubt),
    ...findClosureOver5(figures),
    ...(model ? findOutsideTheBand(figures, input.reference.pressureKpa, model) : []),
    ...(earlier ? findExchangedInCycle(figures, earlier) : []),
  ];
}

/** A column is of another width, or shifted, or has pairs exchanged: the first that explains it. */
function findInColumns(grid: Grid, offTheLine: OffTheLine[]): Doubt[] {
  const ofAnotherWidth = findColumnsOfAnotherWidth(grid);
  const sound = new Map<Row, number[]>();
  for (const row of grid.rows) {
    const off = offTheLine.filter(({ injectorId }) => injectorId === row.injectorId);
    const isOff = (width: number) =>
      off.some(({ pulseWidthMs }) => pulseWidthMs === width) ||
      ofAnotherWidth.some(({ pulseWidthMs }) => pulseWidthMs === width);
    sound.set(
      row,
      grid.widths.filter((width) => row.cells.has(width) && !isOff(width)),
    );
  }
  const others = grid.columns.filter(
    (column) => !ofAnotherWidth.some(({ pulseWidthMs }) => pulseWidthMs === column),
  );
  return [
    ...ofAnotherWidth,
    ...others.flatMap((column): Doubt[] => {
      const predictions = predictColumn(grid, column, sound);
      const shifted = findShiftedColumn(grid, column, predictions);
      return shifted ? [shifted] : findExchangedInColumn(column, predictions);
    }),
  ];
}

function covers(doubt: Doubt, injectorId: string, width: Column): boolean {
  if (doubt.pulseWidthMs !== width) return false;
  const other = "otherInjectorId" in doubt ? doubt.otherInjectorId : null;
  return doubt.injectorId === null || doubt.injectorId === injectorId || other === injectorId;
}
