import { railStrip } from "../../format/picture/rail-strip";
import type { Percents } from "../../format/picture/rail-strip-scale";
import { describeRailStrip } from "./describe-rail-strip";
import { RailStripInjector } from "./rail-strip-injector";

export type RailStripSize = "list" | "panel" | "grid";

type Props = {
  /** Deviation of each from the set's mean in percent; null where there is no figure. */
  left?: Percents;
  /** As found, drawn pale behind. */
  found?: Percents;
  /** Half of the allowed spread: the two hairlines. */
  halfLimitPercent: number | null;
  labels?: readonly string[];
  size?: RailStripSize;
  /** What the deviations are of: "static flow". */
  of?: string;
};

const heights = { list: 40, grid: 108, panel: 190 };

/**
 * The product's own picture: a rail with one bar per injector. Across it is drawn in hundredths of the width, so that it fits any
 * width without its letters shrinking.
 */
export function RailStrip({
  left = [],
  found = [],
  halfLimitPercent,
  labels,
  size = "panel",
  of = "static flow",
}: Props) {
  const height = heights[size];
  const lettered = size !== "list";
  const picture = railStrip({
    found,
    left,
    labels,
    halfLimitPercent,
    width: 100,
    height,
    railHeight: size === "list" ? 3 : 4,
    showLabels: lettered,
  });
  const { rail, meanY, limits, injectors, labelY } = picture;
  return (
    <svg
      role="img"
      aria-label={describeRailStrip(picture, { of, halfLimitPercent, brief: size === "list" })}
      width="100%"
      height={height}
      className={size === "list" ? "block min-w-32 max-w-56" : "block"}
    >
      {limits ? (
        <g className="stroke-ink-2" strokeWidth="0.8" strokeDasharray="2 3">
          <line x1="0" x2="100%" y1={limits.highY} y2={limits.highY} />
          <line x1="0" x2="100%" y1={limits.lowY} y2={limits.lowY} />
        </g>
      ) : null}
      {injectors.map((injector, index) => (
        <RailStripInjector
          key={injector.label}
          injector={injector}
          labelY={labelY}
          crowd={crowdOf(index, injectors.length)}
        />
      ))}
      <line x1="0" x2="100%" y1={meanY} y2={meanY} className="stroke-ink" strokeWidth="0.9" />
      <rect x="0" y={rail.y} width="100%" height={rail.height} rx={rail.height / 2} className="fill-ink" />
    </svg>
  );
}

/** With many injectors only some carry their number, fewer still on a phone. */
function crowdOf(index: number, count: number): "always" | "wide only" | "never" {
  const everywhere = count > 32 ? 4 : count > 16 ? 2 : 1;
  const wide = count > 32 ? 2 : 1;
  if (index % everywhere === 0) return "always";
  return index % wide === 0 ? "wide only" : "never";
}
