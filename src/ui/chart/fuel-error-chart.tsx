"use client";
import {
  CartesianGrid,
  Line,
  LineChart,
  ReferenceArea,
  ReferenceLine,
  ResponsiveContainer,
  Tooltip,
  XAxis,
  YAxis,
} from "recharts";
import { formatNumber, formatSigned } from "../../format/format-number";
import { niceTicks } from "../../format/picture/nice-ticks";
import { axisStyle, chartHeight, foundInk, gridStyle, leftInk } from "./chart-style";
import { EndLabels } from "./end-labels";
import { FuelErrorReadout } from "./fuel-error-readout";
import { type FuelErrorSeries, fuelErrorRows, widthTicks } from "./fuel-error-series";
import { HighlightChips } from "./highlight-chips";
import { SeriesTable } from "./series-table";
import { type Highlight, useHighlight } from "./use-highlight";

type Props = Highlight & {
  widthsMs: readonly number[];
  series: readonly FuelErrorSeries[];
  halfLimitPercent?: number | null;
  /** Pulse widths at idle, by common practice. */
  idleMs?: { from: number; to: number };
  height?: number;
};

/** How far each injector's fuel is from the set's mean at every pulse width. */
export function FuelErrorChart(props: Props) {
  const {
    widthsMs,
    series,
    halfLimitPercent = null,
    idleMs = { from: 2.5, to: 4 },
    height = chartHeight,
  } = props;
  const [chosen, choose] = useHighlight(props);
  const low = Math.min(...widthsMs);
  const high = Math.max(...widthsMs);
  const reach = reachOf(series, halfLimitPercent);
  const ticks = niceTicks(-reach, reach, 4);
  const weak = (key: string) => chosen !== null && chosen !== key;
  const idle = { from: Math.max(idleMs.from, low), to: Math.min(idleMs.to, high) };

  return (
    <figure>
      <div aria-hidden="true">
        <ResponsiveContainer width="100%" height={height} initialDimension={{ width: 520, height }}>
          <LineChart
            accessibilityLayer={false}
            data={fuelErrorRows(widthsMs, series)}
            margin={{ top: 18, right: 34, bottom: 16, left: -8 }}
          >
            <CartesianGrid {...gridStyle} />
            {idle.from < idle.to ? (
              <ReferenceArea
                x1={idle.from}
                x2={idle.to}
                fill="var(--color-petrol-soft)"
                fillOpacity={0.6}
                label={{ value: "idle", position: "insideTop", fill: "var(--color-ink-2)", fontSize: 11.5 }}
              />
            ) : null}
            <XAxis
              dataKey="width"
              type="number"
              scale="log"
              domain={[low, high]}
              ticks={widthTicks(low, high)}
              interval={0}
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
              domain={[ticks[0]!, ticks.at(-1)!]}
              ticks={ticks}
              width={52}
              tickFormatter={(percent: number) => formatSigned(percent, "closure").replace(/\.?0+$/, "")}
              label={{ value: "%", position: "top", offset: 8, fill: "var(--color-ink-2)", fontSize: 11.5 }}
              {...axisStyle}
              axisLine={false}
            />
            <ReferenceLine y={0} stroke="var(--color-ink)" strokeWidth={0.9} />
            {halfLimitPercent === null
              ? null
              : [halfLimitPercent, -halfLimitPercent].map((limit) => (
                  <ReferenceLine key={limit} y={limit} stroke="var(--color-ink-2)" strokeDasharray="2 3" />
                ))}
            {series.map(({ key, found }) =>
              found ? (
                <Line
                  key={`found ${key}`}
                  dataKey={`found ${key}`}
                  stroke={foundInk}
                  strokeWidth={1}
                  strokeOpacity={weak(key) ? 0.12 : 0.55}
                  dot={false}
                  activeDot={false}
                  isAnimationActive={false}
                />
              ) : null,
            )}
            {series.map(({ key }) => (
              <Line
                key={key}
                dataKey={`left ${key}`}
                stroke={leftInk}
                strokeWidth={key === chosen ? 2.4 : 1.2}
                strokeOpacity={weak(key) ? 0.22 : 0.9}
                dot={false}
                activeDot={weak(key) ? false : { r: 3, fill: "var(--color-sheet)", stroke: leftInk }}
                isAnimationActive={false}
              />
            ))}
            <Tooltip
              content={({ active, label }) =>
                active ? (
                  <FuelErrorReadout
                    widthMs={Number(label)}
                    widthsMs={widthsMs}
                    series={series}
                    chosen={chosen}
                  />
                ) : null
              }
              cursor={{ stroke: "var(--color-edge)", strokeDasharray: "2 2" }}
              isAnimationActive={false}
              wrapperStyle={{ zIndex: 20 }}
            />
            <EndLabels
              x={high}
              labels={series.map(({ key, label, left }) => ({ key, label, value: left.at(-1) ?? null }))}
              chosen={chosen}
            />
          </LineChart>
        </ResponsiveContainer>
      </div>
      <HighlightChips label="Make one stand out" series={series} chosen={chosen} onChoose={choose} />
      <SeriesTable
        caption="Fuel error of each injector from the set's mean, as left, in percent"
        rowHead="Injector"
        columns={widthsMs.map((width) => `${formatNumber(width, "pulseWidth")} ms`)}
        rows={series.map(({ key, label, left }) => ({
          key,
          head: label,
          cells: widthsMs.map((_, index) => formatSigned(left[index], "deviation")),
        }))}
      />
    </figure>
  );
}

/** What is left must be seen whole; what was found may run out of the picture. */
function reachOf(series: readonly FuelErrorSeries[], halfLimitPercent: number | null): number {
  const largest = Math.max(
    0.5,
    ...series.flatMap(({ left }) => left.map((percent) => Math.abs(percent ?? 0))),
  );
  return Math.max(largest * 1.1, (halfLimitPercent ?? 0) * 1.6);
}
