import type { FlowLine } from "../line/fit-flow-line";
import { sumOf } from "../line/sum-of";
import type { PulseFlow } from "./convert-reading";
import type { ChannelCalibration } from "./types";

/** Standard uncertainties of a slope (µL/ms) or a dead time (ms), by where they come from. */
export type OwnParts = { reading: number; gain: number; offset: number };

/**
 * What resolution, repeatability and the channel's calibration make of the slope and the dead time of a line: each
 * least-squares result is a weighted sum of the readings, so every part is followed through those weights (JCGM 100:2008,
 * 5.1). Resolution is shared by the repeats at one width.
 */
export function ownPartsOfLine(
  flows: readonly PulseFlow[],
  flowLine: FlowLine,
  calibration: ChannelCalibration,
): { slope: OwnParts; deadTime: OwnParts } {
  const { fromMs, toMs } = flowLine.linearRange;
  const fitted = flows.filter(
    ({ pulseWidthMs, dutyPercent }) => pulseWidthMs >= fromMs && pulseWidthMs <= toMs && dutyPercent < 100,
  );
  const { slope, intercept } = coefficientsOf(fitted);
  const { slopeUlPerMs, deadTimeMs } = flowLine;
  const deadTime = slope.map((share, i) => -(intercept[i]! + deadTimeMs * share) / slopeUlPerMs);
  return {
    slope: followThrough(fitted, slope, calibration),
    deadTime: followThrough(fitted, deadTime, calibration),
  };
}

/** The weights with which the readings enter slope and intercept. */
function coefficientsOf(flows: readonly PulseFlow[]): { slope: number[]; intercept: number[] } {
  const differ = new Set(flows.map((flow) => flow.pulseCount)).size > 1;
  const variances = flows.map(({ resolution, repeatability }) => resolution ** 2 + repeatability ** 2);
  const least = Math.min(...variances);
  const weights = variances.map((variance) => (differ && least > 0 ? least / variance : 1));
  const weight = sumOf(weights);
  const centre = sumOf(flows.map(({ pulseWidthMs }, i) => weights[i]! * pulseWidthMs)) / weight;
  const distances = flows.map(({ pulseWidthMs }) => pulseWidthMs - centre);
  const squares = sumOf(distances.map((distance, i) => weights[i]! * distance ** 2));
  const slope = distances.map((distance, i) => (weights[i]! * distance) / squares);
  return { slope, intercept: slope.map((share, i) => weights[i]! / weight - centre * share) };
}

function followThrough(
  flows: readonly PulseFlow[],
  shares: readonly number[],
  { gainU, offsetU }: ChannelCalibration,
): OwnParts {
  const byWidth = new Map<number, number>();
  flows.forEach(({ pulseWidthMs, resolution }, i) => {
    byWidth.set(pulseWidthMs, (byWidth.get(pulseWidthMs) ?? 0) + shares[i]! * resolution);
  });
  const repeatability = flows.map((flow, i) => shares[i]! * flow.repeatability);
  return {
    reading: Math.hypot(...repeatability, ...byWidth.values()),
    gain: Math.abs(gainU * sumOf(flows.map((flow, i) => shares[i]! * flow.perGain))),
    offset: Math.abs(offsetU * sumOf(flows.map((flow, i) => shares[i]! * flow.perOffset))),
  };
}
