import type { PresentedResults } from "@/data/certificates";
import {
  formatNumber,
  formatRange,
  formatSigned,
  formatWithUncertainty,
  noFigure,
} from "@/format/format-number";
import { BeforeAfter } from "@/ui/layout/before-after";
import { DataTable } from "@/ui/layout/data-table";
import type { DataColumn } from "@/ui/layout/data-table-column";
import { InjectorName } from "./injector-name";
import { deadTimeOf, type PhaseResult, type ResultRow, resultRows } from "./result-rows";

/** What the line of each injector says, with its intervals; as found small above, as left below. */
export function FlowLinesTable({ results }: { results: PresentedResults }) {
  return (
    <DataTable
      caption="Flow lines and dead times"
      columns={columns}
      rows={resultRows(results).filter(({ found, left }) => found ?? left)}
      rowKey={(row) => row.injector.injectorId}
      dense
    />
  );
}

function figure(
  key: string,
  [head, unit]: [string, string],
  read: (result: PhaseResult) => string,
  gap = false,
): DataColumn<ResultRow> {
  return {
    key,
    head,
    unit,
    align: "right",
    gap,
    cell: ({ found, left }) => (
      <BeforeAfter before={found ? read(found) : noFigure} after={left ? read(left) : noFigure} />
    ),
  };
}

const lineOf = ({ figures }: PhaseResult) => figures.flowLine;

const columns: DataColumn<ResultRow>[] = [
  { key: "injector", head: "Injector", cell: (row) => <InjectorName injector={row.injector} /> },
  figure("static", ["Static flow", "mL/min, ± U"], ({ figures: { staticFlow } }) =>
    formatWithUncertainty(staticFlow?.value, staticFlow?.expandedUncertainty, "staticFlow"),
  ),
  figure("held open", ["Held open", "mL/min"], ({ figures }) =>
    formatNumber(figures.heldOpen?.mlPerMin, "staticFlow"),
  ),
  figure("closure", ["Closure", "%"], ({ figures }) => formatSigned(figures.closurePercent, "closure")),
  figure(
    "dead time",
    ["Dead time", "ms"],
    (result) => formatNumber(deadTimeOf(result)?.value, "deadTime"),
    true,
  ),
  figure("interval", ["95 % interval", "ms"], intervalOf),
  figure("se", ["Standard error", "ms"], (result) =>
    formatNumber(deadTimeOf(result)?.standardError, "deadTime"),
  ),
  figure("dof", ["Degrees", "of freedom"], (result) =>
    String(lineOf(result)?.line.degreesOfFreedom ?? noFigure),
  ),
  figure("range", ["Linear range", "ms"], rangeOf, true),
  figure("off line", ["Most off line", "%"], mostOffLine),
];

function intervalOf(result: PhaseResult): string {
  const interval = deadTimeOf(result);
  return formatRange(interval?.low, interval?.high, "deadTime");
}

function rangeOf(result: PhaseResult): string {
  const range = lineOf(result)?.linearRange;
  return formatRange(range?.fromMs, range?.toMs, "pulseWidth");
}

/** The largest deviation of a reading within the linear range from its line. */
function mostOffLine(result: PhaseResult): string {
  const deviations = lineOf(result)
    ?.points.filter((point) => point.inLinearRange)
    .map((point) => point.deviationPercent ?? 0);
  const most = deviations?.reduce((one, other) => (Math.abs(other) > Math.abs(one) ? other : one), 0);
  return formatSigned(most, "deviation");
}
