import { formatSigned } from "../../format/format-number";

type Props = {
  percent: number | null;
  /** What reaches the end of the bar. */
  scalePercent: number;
  halfLimitPercent?: number | null;
};

const width = 84;
const half = width / 2;

/** One deviation to the left or right of the middle, for a table's cell. */
export function DeviationBar({ percent, scalePercent, halfLimitPercent = null }: Props) {
  if (percent === null) return <span className="text-ink-2">–</span>;
  const reach = Math.min(1, Math.abs(percent) / scalePercent) * half;
  const outside = halfLimitPercent !== null && Math.abs(percent) > halfLimitPercent;
  const clipped = Math.abs(percent) > scalePercent;
  const limit =
    halfLimitPercent === null ? null : (Math.min(halfLimitPercent, scalePercent) / scalePercent) * half;
  return (
    <svg
      role="img"
      aria-label={`${formatSigned(percent, "deviation")} percent${outside ? ", outside" : ""}`}
      width={width}
      height="12"
      viewBox={`0 0 ${width} 12`}
      className="inline-block align-middle"
    >
      {limit === null ? null : (
        <path
          d={`M${half - limit} 1v10M${half + limit} 1v10`}
          className="stroke-ink-2"
          strokeWidth="0.8"
          strokeDasharray="2 2"
        />
      )}
      <rect
        x={percent < 0 ? half - reach : half}
        y="3"
        width={Math.max(reach, 1)}
        height="6"
        className={outside ? "fill-out" : "fill-petrol"}
      />
      {clipped ? (
        <rect x={percent < 0 ? 4 : width - 6} y="2" width="2" height="8" className="fill-sheet" />
      ) : null}
      <path d={`M${half} 0v12`} className="stroke-ink" strokeWidth="1" />
    </svg>
  );
}
