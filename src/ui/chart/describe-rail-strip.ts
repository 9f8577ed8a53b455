import { formatNumber, formatSigned } from "../../format/format-number";
import type { RailStripPicture } from "../../format/picture/rail-strip";

type Options = { of: string; halfLimitPercent: number | null; brief: boolean };

/** The picture in words, for those who do not see it; in a list only what stands out. */
export function describeRailStrip(
  { injectors }: RailStripPicture,
  { of, halfLimitPercent, brief }: Options,
): string {
  const limit =
    halfLimitPercent === null ? "" : `; allowed ±${formatNumber(halfLimitPercent, "tolerance")} percent`;
  const head = `Deviation of ${of} from the mean of ${injectors.length}`;
  const states = (["left", "found"] as const).map((state) => ({
    state,
    bars: injectors.flatMap(({ label, [state]: bar }) => (bar ? [{ label, percent: bar.percent }] : [])),
  }));
  const said = states.flatMap(({ state, bars }) =>
    bars.length === 0 ? [] : [`as ${state} ${brief ? largestOf(bars) : allOf(bars)}`],
  );
  return said.length === 0 ? `${head}: no figures yet` : `${head}, in percent: ${said.join("; ")}${limit}`;
}

type Entry = { label: string; percent: number };

function allOf(bars: Entry[]): string {
  return bars.map(({ label, percent }) => `${label} ${formatSigned(percent, "deviation")}`).join(", ");
}

function largestOf(bars: Entry[]): string {
  const largest = bars.reduce((most, bar) => (Math.abs(bar.percent) > Math.abs(most.percent) ? bar : most));
  return `largest ${formatSigned(largest.percent, "deviation")} at ${largest.label}`;
}
