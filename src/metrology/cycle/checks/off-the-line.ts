import type { OffTheLine } from "../doubt";
import type { Grid, Row } from "./grid";
import { type Abscissa, abscissaOf, type Prediction, predictAt } from "./predict";

type Suspect = { width: number; prediction: Prediction; repeat: number; flow: number };

/**
 * Readings that the injector's other widths do not predict. One bad reading bends the line for all the others, so that of
 * several suspects the one goes first whose leaving out lets the rest agree best; then the rest is looked at again.
 */
export function findOffTheLine(grid: Grid, row: Row): OffTheLine[] {
  const abscissa = abscissaOf(grid, row);
  let sound = [...abscissa.at.keys()];
  const most = Math.max(1, Math.floor(sound.length / 3));
  const found: OffTheLine[] = [];
  while (found.length < most) {
    const culprit = culpritAmong(suspectsOf(row, abscissa, sound), abscissa);
    if (!culprit) break;
    found.push(doubtOf(row, culprit));
    sound = sound.filter((width) => width !== culprit.width);
  }
  return found;
}

function suspectsOf(row: Row, abscissa: Abscissa, sound: readonly number[]): Suspect[] {
  return sound.flatMap((width) => {
    const prediction = predictAt(row, abscissa, width, sound);
    if (!prediction) return [];
    const { repeats } = row.cells.get(width)!;
    const distances = repeats.map((flow) => Math.abs(flow - prediction.flow));
    const furthest = distances.indexOf(Math.max(...distances));
    return distances[furthest]! > prediction.explained
      ? [{ width, prediction, repeat: furthest + 1, flow: repeats[furthest]! }]
      : [];
  });
}

function culpritAmong(suspects: Suspect[], { by }: Abscissa): Suspect | undefined {
  const [culprit] = [...suspects].sort(({ prediction: a }, { prediction: b }) => {
    const support = by === "width" ? b.support - a.support : 0;
    return support || a.misfit - b.misfit;
  });
  return culprit;
}

function doubtOf({ injectorId }: Row, { width, prediction, repeat, flow }: Suspect): OffTheLine {
  return {
    kind: "off the line",
    injectorId,
    pulseWidthMs: width,
    repeat,
    volumePerPulseUl: flow,
    predictedUl: prediction.flow,
    deviationPercent: (100 * (flow - prediction.flow)) / prediction.flow,
    explainedPercent: (100 * prediction.explained) / prediction.flow,
  };
}
