import type { ColDef, ICellRendererParams } from "ag-grid-community";
import Link from "next/link";
import type { ReactNode } from "react";
import type { GridColumn, GridSort } from "./server-grid-types";

type Options<Row> = { rowHref?: (row: Row) => string; sort?: readonly GridSort[] };

/** Our columns in the grid's own words. The first cell is the row's link. */
export function columnDefinitions<Row>(
  columns: readonly GridColumn<Row>[],
  { rowHref, sort = [] }: Options<Row>,
): ColDef<Row>[] {
  return columns.map(
    ({ key, head, cell, align = "left", width, flex, minWidth = 80, sortable = false }, place) => {
      const sortIndex = sort.findIndex(({ column }) => column === key);
      return {
        colId: key,
        headerName: head,
        width,
        flex: width === undefined ? (flex ?? 1) : flex,
        minWidth,
        sortable,
        sort: sort[sortIndex]?.direction,
        sortIndex: sortIndex < 0 ? undefined : sortIndex,
        // The server sorts; the grid only shows by what.
        comparator: () => 0,
        sortingOrder: ["asc", "desc"],
        resizable: true,
        suppressHeaderMenuButton: true,
        type: align === "right" ? "rightAligned" : undefined,
        cellStyle: {
          display: "flex",
          alignItems: "center",
          justifyContent: align === "right" ? "end" : "start",
        },
        cellRenderer: ({ data }: ICellRendererParams<Row>) => {
          if (!data) return <span className="h-3 w-3/5 rounded-mark bg-hair-2" />;
          const content = cell(data);
          return place === 0 && rowHref ? <RowLink href={rowHref(data)}>{content}</RowLink> : content;
        },
      };
    },
  );
}

function RowLink({ href, children }: { href: string; children: ReactNode }) {
  return (
    <Link href={href} tabIndex={-1} className="font-semibold no-underline hover:underline">
      {children}
    </Link>
  );
}
