import type { DraftFields } from "../../../data/cycles/draft-fields";
import { describeField } from "../../../data/cycles/sheet/describe-field";
import { readSheet } from "../../../data/cycles/sheet/read-sheet";
import type { SheetInjector } from "../../../data/cycles/sheet/types";
import { plural } from "../../../format/plural";
import { Notice } from "../../../ui/feedback/notice";
import { DataTable } from "../../../ui/layout/data-table";
import type { FilePreview, FileProblem } from "./send-file";

type Props = { preview: FilePreview; fields: DraftFields; injectors: SheetInjector[] };

/** What a file would change on the sheet, or line and column of what is wrong with it. */
export function FilePreviewTable({ preview, fields, injectors }: Props) {
  const { rows, problems, changes } = preview;
  if (problems.length > 0) return <Problems problems={problems} />;
  if (changes.length === 0)
    return <Notice className="mt-3">All {rows} readings of the file stand on the sheet already.</Notice>;
  const after = Object.fromEntries(changes.map(({ field, value }) => [field, value]));
  const sheet = readSheet({ ...fields, ...after }, injectors);
  const replaced = changes.filter((change) => change.base !== "").length;
  return (
    <div className="mt-3 max-h-72 overflow-y-auto">
      <Notice live kind={replaced > 0 ? "caution" : "info"}>
        {plural(rows, "reading")} in the file, {plural(changes.length, "value")} would change
        {replaced > 0 ? `, ${replaced} of them typed over` : ""}. All or none are put on the sheet.
      </Notice>
      <DataTable
        caption="What would change"
        dense
        rows={changes}
        rowKey={(change) => change.field}
        columns={[
          { key: "where", head: "Where", align: "left", cell: ({ field }) => describeField(field, sheet) },
          { key: "before", head: "Now", align: "right", cell: ({ base }) => base || "–" },
          { key: "after", head: "File", align: "right", cell: ({ value }) => value },
        ]}
      />
    </div>
  );
}

function Problems({ problems }: { problems: FileProblem[] }) {
  return (
    <div className="mt-3 max-h-72 overflow-y-auto">
      <Notice kind="refusal" live>
        Nothing can be put on the sheet: {plural(problems.length, "place")} to correct in the file
        {problems.length >= 50 ? ", the first fifty of them" : ""}.
      </Notice>
      <DataTable
        caption="What is wrong with the file"
        dense
        rows={problems}
        rowKey={(problem, index) => `${index} ${problem.line}`}
        columns={[
          { key: "line", head: "Line", align: "left", cell: ({ line }) => line },
          { key: "column", head: "Column", align: "left", cell: ({ column }) => column ?? "–" },
          {
            key: "message",
            head: "What is wrong",
            align: "left",
            wrap: true,
            cell: ({ message }) => message,
          },
        ]}
      />
    </div>
  );
}
