import type { PulseFlow } from "./convert-reading";
import { meanFlow } from "./mean-flow";
import type { ChannelCalibration, WidthFlow } from "./types";

/** Flow per pulse at each distinct pulse width, the mean of its repeats, in rising order of width. */
export function flowsByWidth(flows: readonly PulseFlow[], calibration: ChannelCalibration): WidthFlow[] {
  const widths = [...new Set(flows.map((flow) => flow.pulseWidthMs))].sort((a, b) => a - b);
  return widths.map((pulseWidthMs) => {
    const repeats = flows.filter((flow) => flow.pulseWidthMs === pulseWidthMs);
    const { flow, ownU } = meanFlow(repeats, calibration);
    return {
      pulseWidthMs,
      volumePerPulseUl: flow,
      repeats: repeats.length,
      ownU,
      dutyPercent: repeats[0]!.dutyPercent,
    };
  });
}
