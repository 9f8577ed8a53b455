import type { ReactNode } from "react";
import type { PresentedResults } from "@/data/certificates";
import { formatNumber } from "@/format/format-number";
import { DeviationBar } from "@/ui/chart/deviation-bar";
import { BeforeAfter } from "@/ui/layout/before-after";
import { DataTable } from "@/ui/layout/data-table";
import type { DataColumn } from "@/ui/layout/data-table-column";
import { InjectorName } from "./injector-name";
import { flowAt, type ResultRow, resultRows, widthsOf } from "./result-rows";
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
    {
      key: "deviation",
      head: "From mean",
      unit: "static flow, %",
      align: "center",
      gap: true,
      wideOnly: true,
      cell: ({ found, left }) => (
        <DeviationBar found={found?.deviationPercent} left={left?.deviationPercent} />
      ),
    },
  ];
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
        before={formatNumber(found?.figures.flowLine?.deadTimeMs, "deadTime")}
        after={formatNumber(left?.figures.flowLine?.deadTimeMs, "deadTime")}
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
