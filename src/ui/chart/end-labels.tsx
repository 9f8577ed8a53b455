"use client";
import { usePlotArea, useXAxisScale, useYAxisScale } from "recharts";
import { spreadLabels } from "../../format/picture/spread-labels";

type Props = {
  /** Where the curves end. */
  x: number;
  labels: readonly { key: string; label: string; value: number | null }[];
  chosen: string | null;
};

/** The name of each curve at its end, moved apart where they crowd and led back by a hairline. */
export function EndLabels({ x, labels, chosen }: Props) {
  const area = usePlotArea();
  const scaleX = useXAxisScale();
  const scaleY = useYAxisScale();
  if (!area || !scaleX || !scaleY) return null;
  const end = Number(scaleX(x));
  const inside = (y: number) => Math.max(area.y, Math.min(area.y + area.height, y));
  const wanted = labels.flatMap((label) =>
    label.value === null ? [] : [{ label, y: inside(Number(scaleY(label.value))) }],
  );
  const placed = spreadLabels(wanted, { gap: 12, low: area.y, high: area.y + area.height });
  return (
    <g>
      {placed.map(({ label, wantedY, y }) => (
        <g key={label.key} opacity={chosen === null || chosen === label.key ? 1 : 0.45}>
          <path
            d={`M${end + 1} ${wantedY}L${end + 10} ${y}`}
            fill="none"
            stroke="var(--color-edge)"
            strokeWidth="0.75"
          />
          <text
            x={end + 13}
            y={y}
            dy="0.36em"
            fill="var(--color-ink)"
            fontSize="11"
            fontWeight={chosen === label.key ? 600 : 400}
          >
            {label.label}
          </text>
        </g>
      ))}
    </g>
  );
}
