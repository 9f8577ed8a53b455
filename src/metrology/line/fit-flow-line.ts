import { requireFinite, requireNumber, requireProbability } from "../limits";
import { findLinearRange } from "./find-linear-range";
import { fitLine, type LineFit } from "./fit-line";
import { asPoint, type FlowPoint } from "./flow-point";
import { xIntercept } from "./x-intercept";

export type FlowLine = {
  slopeUlPerMs: number;
  staticFlowMlPerMin: number;
  deadTimeMs: number;
  deadTimeSeMs: number | null;
  deadTimeInterval: { low: number; high: number } | null;
  line: LineFit;
  linearRange: { fromMs: number; toMs: number; ratio: number };
  /** In the order given. `deviationPercent` is null where the line predicts no flow. */
  points: {
    pulseWidthMs: number;
    volumePerPulseUl: number;
    predictedUl: number;
    deviationPercent: number | null;
    inLinearRange: boolean;
  }[];
};

/**
 * The flow line q = S · (w − t0) of one injector over its linear range, with its dead time t0.
 *
 * The linear range is the contiguous run of distinct pulse widths with the largest toMs/fromMs whose own least-squares
 * line rises and predicts every reading in the run within ±maxDeviationPercent; deviations are percent of what the line
 * predicts. Ties go to more points, then to the smaller residualSd. Every run is tried. The dead time is always the
 * x-intercept of that line, whatever else the word means in print; see `xIntercept` for its error and interval, which speak of
 * the scatter about the line: an error of channel or timer that all points share is not in them.
 *
 * Units: ms, µL per pulse, S in µL/ms, staticFlowMlPerMin = 60 · S. Range: pulse widths above 0, minWidths from 2,
 * maxDeviationPercent above 0 and up to 100.
 * Throws RangeError for fewer distinct widths than minWidths, when no run holds, or for numbers out of range.
 * Source: the ±5 % linear flow range of SAE J1832 (abstract and public glossaries); the ratio here is of pulse widths.
 */
export function fitFlowLine(
  points: readonly FlowPoint[],
  { maxDeviationPercent = 5, confidence = 0.95, minWidths = 3 } = {},
): FlowLine {
  requireNumber("maxDeviationPercent", maxDeviationPercent, { above: 0, upTo: 100 });
  requireNumber("minWidths", minWidths, { from: 2 });
  requireProbability("confidence", confidence);
  const range = findLinearRange(points.map(checked), { maxDeviationPercent, minWidths });
  const isInside = ({ pulseWidthMs }: FlowPoint) =>
    pulseWidthMs >= range.fromMs && pulseWidthMs <= range.toMs;
  const line = fitLine(points.filter(isInside).map(asPoint));
  const crossing = xIntercept(line, confidence);
  return {
    slopeUlPerMs: line.slope,
    staticFlowMlPerMin: requireFinite("points", 60 * line.slope),
    deadTimeMs: requireFinite("points", crossing.value ?? Number.NaN),
    deadTimeSeMs: crossing.standardError,
    deadTimeInterval: crossing.interval,
    line,
    linearRange: { ...range, ratio: range.toMs / range.fromMs },
    points: points.map((point) => againstLine(point, line, isInside(point))),
  };
}

function checked(point: FlowPoint, index: number): FlowPoint {
  requireNumber(`points[${index}].pulseWidthMs`, point.pulseWidthMs, { above: 0 });
  requireNumber(`points[${index}].volumePerPulseUl`, point.volumePerPulseUl);
  return point;
}

function againstLine(
  { pulseWidthMs, volumePerPulseUl }: FlowPoint,
  { slope, intercept }: LineFit,
  inLinearRange: boolean,
) {
  const predictedUl = intercept + slope * pulseWidthMs;
  const deviation = (100 * (volumePerPulseUl - predictedUl)) / predictedUl;
  return {
    pulseWidthMs,
    volumePerPulseUl,
    predictedUl,
    deviationPercent: predictedUl > 0 && Number.isFinite(deviation) ? deviation : null,
    inLinearRange,
  };
}
