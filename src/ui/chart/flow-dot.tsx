import type { FlowSeries } from "./flow-series";

type Props = {
  series: FlowSeries;
  ink: string;
  weak: boolean;
  /** Given by the chart. */
  cx?: number;
  cy?: number;
  payload?: { width?: number };
};

/** A round mark on the line; one outside the linear range is a cross. */
export function FlowDot({ series, ink, weak, cx, cy, payload }: Props) {
  if (cx === undefined || cy === undefined || !Number.isFinite(cy)) return null;
  const point = series.points.find(({ pulseWidthMs }) => pulseWidthMs === payload?.width);
  const opacity = weak ? 0.2 : 1;
  if (point && !point.inLinearRange)
    return (
      <path
        d={`M${cx - 3} ${cy - 3}l6 6M${cx - 3} ${cy + 3}l6 -6`}
        fill="none"
        stroke={ink}
        strokeWidth="1.3"
        opacity={opacity}
      />
    );
  return (
    <circle
      cx={cx}
      cy={cy}
      r="2.6"
      fill="var(--color-sheet)"
      stroke={ink}
      strokeWidth="1.1"
      opacity={opacity}
    />
  );
}
