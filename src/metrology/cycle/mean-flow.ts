import { sumOf } from "../line/sum-of";
import type { OwnFlow } from "./convert-reading";
import type { ChannelCalibration } from "./types";

/**
 * Mean of repeated flows with its own standard uncertainty. Repeatability goes down with their number; resolution does
 * not, since repeats that hardly differ are rounded alike; gain and offset are the channel's.
 */
export function meanFlow(
  repeats: readonly OwnFlow[],
  { gainU, offsetU }: ChannelCalibration,
): { flow: number; ownU: number } {
  const mean = (pick: (flow: OwnFlow) => number) => sumOf(repeats.map(pick)) / repeats.length;
  const repeatability = Math.sqrt(sumOf(repeats.map(({ repeatability: u }) => u * u))) / repeats.length;
  const ownU = Math.hypot(
    repeatability,
    mean((flow) => flow.resolution),
    gainU * mean((flow) => flow.perGain),
    offsetU * mean((flow) => flow.perOffset),
  );
  return { flow: mean((flow) => flow.flow), ownU };
}
