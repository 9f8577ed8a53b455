import type { ReactNode } from "react";
import { DataTableBody } from "./data-table-body";
import type { DataColumn } from "./data-table-column";
import { DataTableHead } from "./data-table-head";
import { scrollStyle } from "./data-table-style";

type Props<Row> = {
  /** What the table holds; read out, and shown unless `captionHidden`. */
  caption: string;
  captionHidden?: boolean;
  /** The first column names the row and stays in sight while the others scroll. */
  columns: readonly DataColumn<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row, index: number) => string;
  /** Where a row leads: its first cell becomes the link, the whole row follows it. */
  rowHref?: (row: Row) => string | null;
  /** In place of the body when there are no rows. */
  empty?: ReactNode;
  dense?: boolean;
};

/** A dense table for comparing. Rendered on the server; nothing in it needs a script. */
export function DataTable<Row>({
  caption,
  captionHidden = true,
  dense = false,
  empty,
  ...parts
}: Props<Row>) {
  if (parts.rows.length === 0 && empty) return <>{empty}</>;
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: what scrolls must be reachable by keyboard
    <section aria-label={caption} tabIndex={0} className={scrollStyle}>
      <table className="w-full border-collapse">
        <caption
          className={captionHidden ? "sr-only" : "px-4 pt-3 pb-2 text-left text-heading font-semibold"}
        >
          {caption}
        </caption>
        <DataTableHead columns={parts.columns} />
        <DataTableBody {...parts} dense={dense} />
      </table>
    </section>
  );
}
