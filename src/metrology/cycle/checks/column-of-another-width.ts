import { fitFlowLine } from "../../line/fit-flow-line";
import type { ColumnOfAnotherWidth } from "../doubt";
import type { Grid, Row } from "./grid";
import { medianOf } from "./median-of";
import { thresholds } from "./thresholds";

/**
 * Columns that stand off their own width with all injectors and agree with the next shorter or longer one: typed a column
 * too far, or twice. Amounts are read with the pulse count of the width they may belong to.
 */
export function findColumnsOfAnotherWidth({ rows, widths }: Grid): ColumnOfAnotherWidth[] {
  return widths.flatMap((width, index) => {
    const found = [widths[index - 1], widths[index + 1]].flatMap((likely) =>
      likely === undefined ? [] : (compare(rows, width, likely) ?? []),
    );
    return found.sort((a, b) => Math.abs(a.likelyPercent) - Math.abs(b.likelyPercent)).slice(0, 1);
  });
}

function compare(rows: readonly Row[], width: number, likely: number): ColumnOfAnotherWidth | null {
  const { least, left, share } = thresholds.otherWidth;
  const off = (deviations: number[]) => medianOf(deviations.map(Math.abs));
  const pairs: { own: number; other: number }[] = [];
  for (const row of rows) {
    const pair = deviationsOf(row, width, likely);
    if (pair) pairs.push(pair);
    // Nearly every column is sound: two injectors in a row that are on their own width settle it.
    if (pairs.length === 2 && off(pairs.map(({ own }) => own)) < least) return null;
  }
  const own = pairs.map((pair) => pair.own);
  const other = pairs.map((pair) => pair.other);
  const agree = other.filter((deviation) => Math.abs(deviation) < left).length;
  if (pairs.length === 0 || off(own) < least || agree < share * pairs.length) return null;
  return {
    kind: "column of another pulse width",
    injectorId: null,
    pulseWidthMs: width,
    likelyPulseWidthMs: likely,
    deviationPercent: 100 * medianOf(own),
    likelyPercent: 100 * medianOf(other),
  };
}

function deviationsOf(row: Row, width: number, likely: number): { own: number; other: number } | null {
  const [cell, neighbour] = [row.cells.get(width), row.cells.get(likely)];
  if (!cell || !neighbour) return null;
  const line = lineWithout(row, [width, likely]) ?? lineWithout(row, [width]);
  if (!line) return null;
  const share = (flow: number, at: number) => flow / (line.slope * (at - line.deadTimeMs)) - 1;
  if (Math.min(width, likely) <= line.deadTimeMs) return null;
  return { own: share(cell.flow, width), other: share(neighbour.flowOf(cell.amount), likely) };
}

function lineWithout({ cells }: Row, left: readonly number[]): { slope: number; deadTimeMs: number } | null {
  const points = [...cells].flatMap(([column, { flow }]) =>
    column === null || left.includes(column) ? [] : [{ pulseWidthMs: column, volumePerPulseUl: flow }],
  );
  try {
    const { slopeUlPerMs, deadTimeMs } = fitFlowLine(points);
    return { slope: slopeUlPerMs, deadTimeMs };
  } catch (error) {
    if (error instanceof RangeError) return null;
    throw error;
  }
}
