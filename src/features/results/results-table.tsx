import type { ReactNode } from "react";
import type { PresentedResults } from "@/data/certificates";
import { formatNumber, formatUncertainty } from "@/format/format-number";
import { DeviationBar } from "@/ui/chart/deviation-bar";
import { BeforeAfter } from "@/ui/layout/before-after";
import { DataTable } from "@/ui/layout/data-table";
import type { DataColumn } from "@/ui/layout/data-table-column";
import { InjectorName } from "./injector-name";
import {
  type DeadTime,
  deadTimeOf,
  deviationScale,
  flowAt,
  halfLimitOf,
  type ResultRow,
  resultRows,
  widthsOf,
} from "./result-rows";
import { spreadFoot } from "./spread-foot";

/** Every injector at every pulse width: as found small above, as left below, the spread in the last row. */
export function ResultsTable({ results }: { results: PresentedResults }) {
  return (
    <DataTable
      caption="Flow of every injector, as found above and as left below"
      columns={columnsOf(results)}
      rows={resultRows(results)}
      rowKey={(row) => row.injector.injectorId}
      dense
    />
  );
}

function columnsOf(results: PresentedResults): DataColumn<ResultRow>[] {
  const foot = spreadFoot(results);
  return [
    {
      key: "injector",
      head: "Injector",
      cell: (row) => <InjectorName injector={row.injector} />,
      foot: "Spread, %",
    },
    ...widthsOf(results).map(
      (width): DataColumn<ResultRow> => ({
        key: `width ${width}`,
        head: `${formatNumber(width, "pulseWidth")} ms`,
        unit: "µL",
        align: "right",
        cell: ({ found, left }) => (
          <BeforeAfter
            before={formatNumber(flowAt(found, width), "flowPerPulse")}
            after={formatNumber(flowAt(left, width), "flowPerPulse")}
          />
        ),
        foot: foot.width(width),
      }),
    ),
    staticColumn(foot.staticFlow),
    deadTimeColumn(foot.deadTime),
    windingColumn(foot.resistance),
    deviationColumn(results),
  ];
}

function deviationColumn(results: PresentedResults): DataColumn<ResultRow> {
  const scalePercent = deviationScale(results);
  return {
    key: "deviation",
    head: "From mean",
    unit: `−${scalePercent} % … +${scalePercent} %`,
    align: "center",
    gap: true,
    wideOnly: true,
    cell: ({ found, left }) => (
      <DeviationBar
        percent={(results.asLeft ? left : found)?.deviationPercent ?? null}
        scalePercent={scalePercent}
        halfLimitPercent={halfLimitOf(results)}
      />
    ),
  };
}

function staticColumn(foot: ReactNode): DataColumn<ResultRow> {
  return {
    key: "static",
    head: "Static",
    unit: "mL/min",
    align: "right",
    gap: true,
    cell: ({ found, left }) => (
      <BeforeAfter
        before={formatNumber(found?.figures.staticFlow?.value, "staticFlow")}
        after={formatNumber(left?.figures.staticFlow?.value, "staticFlow")}
      />
    ),
    foot,
  };
}

function deadTimeColumn(foot: ReactNode): DataColumn<ResultRow> {
  return {
    key: "dead time",
    head: "Dead time",
    unit: "ms",
    align: "right",
    gap: true,
    cell: ({ found, left }) => (
      <BeforeAfter
        before={formatNumber(deadTimeOf(found)?.value, "deadTime")}
        after={formatNumber(deadTimeOf(left)?.value, "deadTime")}
        small={plusMinus(deadTimeOf(left))}
      />
    ),
    foot: (
      <>
        <span className="sr-only">Range, ms: </span>
        {foot}
      </>
    ),
  };
}

/** The further end of the interval, which is hardly ever the same to both sides. */
function plusMinus(deadTime: DeadTime | null): string | null {
  if (!deadTime) return null;
  const { value, low, high } = deadTime;
  return `±${formatUncertainty(Math.max(high - value, value - low), "deadTime")}`;
}

function windingColumn(foot: ReactNode): DataColumn<ResultRow> {
  return {
    key: "winding",
    head: "Winding",
    unit: "Ω at 20 °C",
    align: "right",
    gap: true,
    cell: ({ found, left }) => (
      <BeforeAfter
        before={formatNumber(found?.checks?.resistance?.ohmsAt20C, "resistance")}
        after={formatNumber(left?.checks?.resistance?.ohmsAt20C, "resistance")}
      />
    ),
    foot: (
      <>
        <span className="sr-only">Range, Ω: </span>
        {foot}
      </>
    ),
  };
}
