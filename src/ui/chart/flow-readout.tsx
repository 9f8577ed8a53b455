import { formatNumber } from "../../format/format-number";
import type { FlowSeries } from "./flow-series";
import { Readout } from "./readout";

type Props = {
  widthMs: number;
  left: readonly FlowSeries[];
  found: readonly FlowSeries[];
  chosen: string | null;
};

export function FlowReadout({ widthMs, left, found, chosen }: Props) {
  const named = left.length > 0 ? left : found;
  const shown = chosen === null ? named : named.filter(({ key }) => key === chosen);
  return (
    <Readout
      title={`${formatNumber(widthMs, "pulseWidth")} ms, µL`}
      withFound={found.length > 0}
      rows={shown.map(({ key, label }) => ({
        key,
        label,
        left: flowAt(left, key, widthMs),
        found: flowAt(found, key, widthMs),
      }))}
    />
  );
}

function flowAt(all: readonly FlowSeries[], key: string, widthMs: number): string {
  const series = all.find((one) => one.key === key);
  const point = series?.points.find(({ pulseWidthMs }) => pulseWidthMs === widthMs);
  return formatNumber(point?.volumePerPulseUl, "flowPerPulse");
}
