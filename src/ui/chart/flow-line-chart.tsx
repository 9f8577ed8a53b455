"use client";
import {
  CartesianGrid,
  Line,
  LineChart,
  ReferenceLine,
  ResponsiveContainer,
  Tooltip,
  XAxis,
  YAxis,
} from "recharts";
import { formatNumber, formatQuantity } from "../../format/format-number";
import { niceTicks } from "../../format/picture/nice-ticks";
import { axisStyle, chartHeight, foundInk, gridStyle, leftInk } from "./chart-style";
import { FlowDot } from "./flow-dot";
import { FlowReadout } from "./flow-readout";
import { type FlowSeries, flowRows, meanDeadTime, segmentOf } from "./flow-series";
import { HighlightChips } from "./highlight-chips";
import { SeriesTable } from "./series-table";
import { type Highlight, useHighlight } from "./use-highlight";

type Props = Highlight & { left: readonly FlowSeries[]; found?: readonly FlowSeries[]; height?: number };

/** Flow per pulse against pulse width with the fitted lines; points off the linear range are crossed out, found ones pale. */
export function FlowLineChart(props: Props) {
  const { left, found = [], height = chartHeight } = props;
  const [chosen, choose] = useHighlight(props);
  const rows = flowRows(left, found);
  const widest = Math.max(1, ...rows.map(({ width }) => width!));
  const most = Math.max(
    1,
    ...[...left, ...found].flatMap(({ points }) => points.map((p) => p.volumePerPulseUl)),
  );
  const xTicks = niceTicks(0, widest, 5);
  const yTicks = niceTicks(0, most, 4);
  const named = left.length > 0 ? left : found;
  const chosenFit = named.find(({ key }) => key === chosen)?.fit;
  const deadTime = chosenFit?.deadTimeMs ?? meanDeadTime(named);
  const weak = (key: string) => chosen !== null && chosen !== key;

  return (
    <figure>
      <div aria-hidden="true">
        <ResponsiveContainer width="100%" height={height} initialDimension={{ width: 520, height }}>
          <LineChart
            accessibilityLayer={false}
            data={rows}
            margin={{ top: 18, right: 12, bottom: 16, left: -8 }}
          >
            <CartesianGrid {...gridStyle} />
            <XAxis
              dataKey="width"
              type="number"
              domain={[0, xTicks.at(-1)!]}
              ticks={xTicks}
              tickFormatter={(width: number) => formatNumber(width, "pulseWidth")}
              label={{
                value: "ms",
                position: "insideBottomRight",
                offset: -12,
                fill: "var(--color-ink-2)",
                fontSize: 11.5,
              }}
              {...axisStyle}
            />
            <YAxis
              domain={[0, yTicks.at(-1)!]}
              ticks={yTicks}
              width={52}
              label={{ value: "µL", position: "top", offset: 8, fill: "var(--color-ink-2)", fontSize: 11.5 }}
              {...axisStyle}
              axisLine={false}
            />
            {found.map((series) => (
              <Fit
                key={`found ${series.key}`}
                series={series}
                widest={widest}
                ink={foundInk}
                weak={weak(series.key)}
              />
            ))}
            {left.map((series) => (
              <Fit
                key={series.key}
                series={series}
                widest={widest}
                ink={leftInk}
                weak={weak(series.key)}
                strong={series.key === chosen}
              />
            ))}
            {deadTime === null ? null : (
              <ReferenceLine
                segment={[
                  { x: deadTime, y: 0 },
                  { x: deadTime, y: yTicks.at(-1)! * 0.8 },
                ]}
                stroke="var(--color-ink)"
                label={{
                  value: `${chosenFit ? "dead time" : "mean dead time"} ${formatQuantity(deadTime, "deadTime")}`,
                  position: "top",
                  textAnchor: "start",
                  fill: "var(--color-ink-2)",
                  fontSize: 11.5,
                }}
              />
            )}
            {[
              ...found.map((series) => ({ series, state: "found" })),
              ...left.map((series) => ({ series, state: "left" })),
            ].map(({ series, state }) => (
              <Line
                key={`${state} ${series.key}`}
                dataKey={`${state} ${series.key}`}
                stroke="none"
                dot={
                  <FlowDot
                    series={series}
                    ink={state === "left" ? leftInk : foundInk}
                    weak={weak(series.key)}
                  />
                }
                activeDot={false}
                isAnimationActive={false}
              />
            ))}
            <Tooltip
              content={({ active, label }) =>
                active ? (
                  <FlowReadout widthMs={Number(label)} left={left} found={found} chosen={chosen} />
                ) : null
              }
              cursor={{ stroke: "var(--color-edge)", strokeDasharray: "2 2" }}
              isAnimationActive={false}
              wrapperStyle={{ zIndex: 20 }}
            />
          </LineChart>
        </ResponsiveContainer>
      </div>
      <HighlightChips label="Make one stand out" series={named} chosen={chosen} onChoose={choose} />
      <FlowTable series={named} />
    </figure>
  );
}

type FitProps = { series: FlowSeries; widest: number; ink: string; weak: boolean; strong?: boolean };

function Fit({ series, widest, ink, weak, strong = false }: FitProps) {
  const segment = segmentOf(series, widest);
  if (!segment) return null;
  return (
    <ReferenceLine
      segment={segment}
      stroke={ink}
      strokeWidth={strong ? 2.4 : 1.1}
      strokeOpacity={weak ? 0.2 : 0.85}
    />
  );
}

function FlowTable({ series }: { series: readonly FlowSeries[] }) {
  const widths = [...new Set(series.flatMap(({ points }) => points.map((point) => point.pulseWidthMs)))].sort(
    (a, b) => a - b,
  );
  return (
    <SeriesTable
      caption="Flow per pulse in µL at each pulse width, and the dead time of the fitted line"
      rowHead="Injector"
      columns={[...widths.map((width) => formatQuantity(width, "pulseWidth")), "Dead time"]}
      rows={series.map(({ key, label, points, fit }) => ({
        key,
        head: label,
        cells: [
          ...widths.map((width) =>
            formatNumber(
              points.find((point) => point.pulseWidthMs === width)?.volumePerPulseUl,
              "flowPerPulse",
            ),
          ),
          formatQuantity(fit?.deadTimeMs, "deadTime"),
        ],
      }))}
    />
  );
}
