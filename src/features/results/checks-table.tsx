import type { CertifiedChecks, PresentedResults } from "@/data/certificates";
import { formatNumber, formatQuantity, formatWithUncertainty, noFigure } from "@/format/format-number";
import { StatusMark } from "@/ui/feedback/status-mark";
import { BeforeAfter } from "@/ui/layout/before-after";
import { DataTable } from "@/ui/layout/data-table";
import type { DataColumn } from "@/ui/layout/data-table-column";
import { InjectorName } from "./injector-name";
import { type ResultRow, resultRows } from "./result-rows";

/** Winding, insulation, leakage and spray of each injector. */
export function ChecksTable({ results }: { results: PresentedResults }) {
  return (
    <DataTable
      caption="Winding, leakage and spray"
      columns={columns}
      rows={resultRows(results).filter(({ found, left }) => found ?? left)}
      rowKey={(row) => row.injector.injectorId}
      dense
    />
  );
}

type Checks = CertifiedChecks | null | undefined;

function check(
  key: string,
  [head, unit]: [string, string?],
  read: (checks: Checks) => string,
  options: Partial<DataColumn<ResultRow>> = {},
): DataColumn<ResultRow> {
  return {
    key,
    head,
    unit,
    cell: ({ found, left }) => <BeforeAfter before={read(found?.checks)} after={read(left?.checks)} />,
    ...options,
  };
}

const columns: DataColumn<ResultRow>[] = [
  { key: "injector", head: "Injector", cell: (row) => <InjectorName injector={row.injector} /> },
  check("winding", ["Winding", "Ω at 20 °C, ± U"], resistanceText, { align: "right" }),
  {
    key: "band",
    head: "Model’s band",
    cell: ({ found, left }) => {
      const resistance = (left ?? found)?.checks?.resistance;
      return resistance ? <StatusMark kind={resistance.bandVerdict} /> : noFigure;
    },
  },
  check(
    "insulation",
    ["Insulation", "MΩ"],
    (checks) => formatNumber(checks?.insulationMegohm, "insulation"),
    {
      align: "right",
      gap: true,
    },
  ),
  check("leakage", ["Leakage", "mm³/min"], (checks) => formatNumber(checks?.leakage?.mm3PerMin, "leakage"), {
    align: "right",
    gap: true,
  }),
  check("leakage at", ["measured at"], leakageConditions),
  check("spray", ["Spray"], (checks) => checks?.sprayGrade ?? noFigure, { gap: true }),
  check("note", ["Note"], (checks) => checks?.note || noFigure, { wideOnly: true, wrap: true }),
];

function resistanceText(checks: Checks): string {
  const resistance = checks?.resistance;
  return formatWithUncertainty(resistance?.ohmsAt20C, resistance?.expandedUncertainty, "resistance");
}

function leakageConditions(checks: Checks): string {
  const leakage = checks?.leakage;
  return leakage
    ? `${formatQuantity(leakage.pressureKpa, "pressure")}, ${formatQuantity(leakage.seconds, "openTime")}`
    : noFigure;
}
