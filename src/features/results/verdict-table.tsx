import type { PresentedResults } from "@/data/certificates";
import { StatusMark } from "@/ui/feedback/status-mark";
import { DataTable } from "@/ui/layout/data-table";
import type { DataColumn } from "@/ui/layout/data-table-column";
import { type CriterionRow, criterionRows, limitText, nameOf, valueText } from "./criterion-rows";

/** Each criterion of the tolerance class with its figure, its limit and the verdict, and the rule that decided. */
export function VerdictTable({ results }: { results: PresentedResults }) {
  const rows = criterionRows(results);
  const rule = (results.asLeft ?? results.asFound)?.verdict.decisionRule;
  return (
    <>
      <DataTable
        caption="Verdict on each criterion"
        columns={columns}
        rows={rows}
        rowKey={(row) => row.key}
        dense
        empty={<p className="px-4 pb-3 text-ink-2">The tolerance class sets no limit.</p>}
      />
      {rule ? <p className="border-t border-hair-2 px-4 py-2.5 text-small text-ink-2">{rule}</p> : null}
    </>
  );
}

const columns: DataColumn<CriterionRow>[] = [
  { key: "criterion", head: "Criterion", cell: nameOf },
  { key: "limit", head: "Limit", align: "right", cell: (row) => limitText(row) },
  { key: "found", head: "As found", align: "right", cell: (row) => valueText(row.found), gap: true },
  {
    key: "found verdict",
    head: <span className="sr-only">Verdict as found</span>,
    cell: (row) => verdict(row.found),
  },
  { key: "left", head: "As left", align: "right", cell: (row) => valueText(row.left), gap: true },
  {
    key: "left verdict",
    head: <span className="sr-only">Verdict as left</span>,
    cell: (row) => verdict(row.left),
  },
];

function verdict(criterion: CriterionRow["left"]) {
  return criterion ? <StatusMark kind={criterion.verdict ?? "neutral"} /> : null;
}
