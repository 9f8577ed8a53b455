"use client";
import type { SheetInjector } from "../../../data/cycles/sheet/types";
import { formatNumber, formatUncertainty } from "../../../format/format-number";
import type { CycleFigures, InjectorFigures } from "../../../metrology/cycle/types";
import { FlowLineChart } from "../../../ui/chart/flow-line-chart";
import { RailStrip } from "../../../ui/chart/rail-strip";
import { DataTable } from "../../../ui/layout/data-table";
import { Sheet } from "../../../ui/layout/sheet";
import { deviations, flowSeries } from "./figures-to-draw";

type Props = {
  injectors: SheetInjector[];
  figures: CycleFigures | null;
  earlier: CycleFigures | null;
  problem: string | null;
  /** Conditions that the figures assume until they are typed. */
  assumed: string | null;
  halfLimitPercent: number | null;
};

/** Rail strip, lines and the figures of each injector, drawn as the readings are typed. */
export function LiveFigures({ injectors, figures, earlier, problem, assumed, halfLimitPercent }: Props) {
  const labels = injectors.map((injector) => String(injector.position));
  return (
    <div className="flex flex-col gap-3">
      <Sheet title="Rail strip" note="static flow against the mean">
        <RailStrip
          size="grid"
          labels={labels}
          found={deviations(injectors, earlier)}
          left={deviations(injectors, figures)}
          halfLimitPercent={halfLimitPercent}
        />
        {problem || assumed ? <p className="mt-1 text-small text-ink-2">{problem ?? assumed}</p> : null}
      </Sheet>
      <Sheet title="Flow lines" note="µL per pulse">
        <FlowLineChart
          left={flowSeries(injectors, figures)}
          found={flowSeries(injectors, earlier)}
          height={210}
        />
      </Sheet>
      <Sheet title="Figures" note="as they stand now" padding="none">
        <FiguresTable injectors={injectors} figures={figures} />
      </Sheet>
    </div>
  );
}

type Row = SheetInjector & { its: InjectorFigures | undefined };

function FiguresTable({ injectors, figures }: { injectors: SheetInjector[]; figures: CycleFigures | null }) {
  const rows: Row[] = injectors.map((injector) => ({
    ...injector,
    its: figures?.injectors.find((candidate) => candidate.injectorId === injector.setInjectorId),
  }));
  return (
    <DataTable
      caption="Static flow, dead time and closure of each injector"
      dense
      rows={rows}
      rowKey={(row) => row.setInjectorId}
      columns={[
        { key: "place", head: "Injector", align: "left", cell: (row) => row.tag.split("/").at(-1) },
        {
          key: "static",
          head: "Static",
          unit: "mL/min",
          align: "right",
          cell: ({ its }) => formatNumber(its?.staticFlow?.value, "staticFlow"),
          foot: formatNumber(figures?.staticSpread?.spreadPercent, "spread"),
        },
        {
          key: "dead",
          head: "Dead time",
          unit: "ms",
          align: "right",
          cell: ({ its }) => <DeadTime figures={its} />,
          foot: formatNumber(figures?.deadTimeRange?.rangeMs, "deadTime"),
        },
        {
          key: "closure",
          head: "Closure",
          unit: "%",
          align: "right",
          cell: ({ its }) => formatNumber(its?.closurePercent, "closure"),
        },
      ]}
    />
  );
}

function DeadTime({ figures }: { figures: InjectorFigures | undefined }) {
  const line = figures?.flowLine;
  if (!line) return <span title={figures?.lineProblem ?? undefined}>–</span>;
  const { low, high } = line.deadTimeInterval ?? { low: null, high: null };
  return (
    <>
      {formatNumber(line.deadTimeMs, "deadTime")}
      {low === null || high === null ? null : (
        <span className="ml-1 text-key text-ink-2">±{formatUncertainty((high - low) / 2, "deadTime")}</span>
      )}
    </>
  );
}
