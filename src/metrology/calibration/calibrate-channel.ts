import { requireFinite, requireNumber } from "../limits";
import { fitLine } from "../line/fit-line";

export type ChannelFit = {
  gain: number;
  offset: number;
  /** Standard uncertainties of gain and offset; null with two points. */
  gainU: number | null;
  offsetU: number | null;
  residualSd: number | null;
  standardUncertainty: number | null;
  maxErrorMl: number;
};

/**
 * Calibration of one channel from volumes read in its cylinder and the true volumes found by weighing:
 * true = gain · indicated + offset, by least squares.
 *
 * `residualSd` is the scatter about that line (n − 2). `standardUncertainty` is that of one corrected volume, the largest
 * within the calibrated range: the scatter and the line's own uncertainty at the end further from the mean. `maxErrorMl`
 * is the largest error of indication, indicated − true without its sign, before correction. Two points leave no scatter:
 * all uncertainties are null.
 *
 * Units: mL (or g, for a balance channel). Range: at least two points with different indicated volumes.
 * Throws RangeError for fewer points, volumes all alike, or numbers out of range.
 * Sources: JCGM 100:2008 (GUM), H.3, for the line as a calibration; ISO 4787 for the weighing that gives true volumes.
 */
export function calibrateChannel(points: readonly { indicatedMl: number; trueMl: number }[]): ChannelFit {
  const line = fitLine(points.map(checked).map(({ indicatedMl: x, trueMl: y }) => ({ x, y })));
  const errors = points.map(({ indicatedMl, trueMl }) => Math.abs(indicatedMl - trueMl));
  return {
    gain: line.slope,
    offset: line.intercept,
    gainU: line.slopeSe,
    offsetU: line.interceptSe,
    residualSd: line.residualSd,
    standardUncertainty: ofOneVolume(
      points.map(({ indicatedMl }) => indicatedMl),
      line.residualSd,
    ),
    maxErrorMl: errors.reduce((most, error) => Math.max(most, error), 0),
  };
}

function checked(point: { indicatedMl: number; trueMl: number }, index: number) {
  requireNumber(`points[${index}].indicatedMl`, point.indicatedMl);
  requireNumber(`points[${index}].trueMl`, point.trueMl);
  return point;
}

function ofOneVolume(indicated: number[], residualSd: number | null): number | null {
  if (residualSd === null) return null;
  const mean = indicated.reduce((sum, volume) => sum + volume / indicated.length, 0);
  const distances = indicated.map((volume) => Math.abs(volume - mean));
  const furthest = distances.reduce((most, distance) => Math.max(most, distance), 0);
  const squares = distances.reduce((sum, distance) => sum + (distance / furthest) ** 2, 0);
  return requireFinite("points", residualSd * Math.sqrt(1 + 1 / indicated.length + 1 / squares));
}
