import type { ExchangedInColumn } from "../doubt";
import type { Column, Row } from "./grid";
import type { Prediction } from "./predict";
import { thresholds } from "./thresholds";

type Pair = { doubt: ExchangedInColumn; gain: number };

/**
 * Pairs in one column whose readings stand off in opposite directions and are both explained when exchanged. An injector
 * is named in one pair at most, the one that gains most.
 */
export function findExchangedInColumn(
  column: Column,
  predictions: Map<Row, Prediction>,
): ExchangedInColumn[] {
  const rows = [...predictions.keys()].filter((row) => standsOff(row, column, predictions.get(row)!));
  const pairs = rows.flatMap((row, index) =>
    rows.slice(index + 1).flatMap((other) => pairOf(row, other, column, predictions) ?? []),
  );
  const taken = new Set<string>();
  return pairs
    .sort((a, b) => b.gain - a.gain)
    .flatMap(({ doubt }) => {
      if (taken.has(doubt.injectorId) || taken.has(doubt.otherInjectorId)) return [];
      taken.add(doubt.injectorId).add(doubt.otherInjectorId);
      return [doubt];
    });
}

function standsOff(row: Row, column: Column, { flow, u }: Prediction): boolean {
  const { least, coverage } = thresholds.exchange;
  return Math.abs(row.cells.get(column)!.flow - flow) > Math.max(least * flow, coverage * u);
}

function pairOf(a: Row, b: Row, column: Column, predictions: Map<Row, Prediction>): Pair | null {
  const [ofA, ofB] = [predictions.get(a)!, predictions.get(b)!];
  const [inA, inB] = [a.cells.get(column)!, b.cells.get(column)!];
  const before = [inA.flow - ofA.flow, inB.flow - ofB.flow] as const;
  const after = [inA.flowOf(inB.amount) - ofA.flow, inB.flowOf(inA.amount) - ofB.flow] as const;
  const left = Math.hypot(...after) / Math.hypot(...before);
  const explained = Math.abs(after[0]) <= ofA.explained && Math.abs(after[1]) <= ofB.explained;
  if (before[0] * before[1] > 0 || !explained || left > thresholds.exchange.left) return null;
  const percent = ([x, y]: readonly [number, number]): [number, number] => [
    (100 * x) / ofA.flow,
    (100 * y) / ofB.flow,
  ];
  return {
    gain: Math.hypot(...before) - Math.hypot(...after),
    doubt: {
      kind: "two injectors exchanged in a column",
      injectorId: a.injectorId,
      otherInjectorId: b.injectorId,
      pulseWidthMs: column,
      deviationsPercent: percent(before),
      exchangedPercent: percent(after),
    },
  };
}
