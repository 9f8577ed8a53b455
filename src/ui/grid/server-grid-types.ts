import type { ReactNode } from "react";

export type GridSort = { column: string; direction: "asc" | "desc" };

export type PageRequest<Filter> = { startRow: number; endRow: number; sort: GridSort[]; filter: Filter };

export type PageOfRows<Row> = { rows: Row[]; total: number };

export type GridColumn<Row> = {
  /** Name of the column, as sorting says it to the server. */
  key: string;
  head: string;
  cell: (row: Row) => ReactNode;
  align?: "left" | "right";
  width?: number;
  /** Share of what is left over. */
  flex?: number;
  minWidth?: number;
  sortable?: boolean;
};

export type ServerGridProps<Row, Filter> = {
  /** What the list holds, for those who do not see it. */
  label: string;
  columns: readonly GridColumn<Row>[];
  fetchPage: (request: PageRequest<Filter>) => Promise<PageOfRows<Row>>;
  /** Handed to `fetchPage` as it is; a changed one loads the list anew. */
  filter: Filter;
  /** Order at first. */
  sort?: readonly GridSort[];
  onSort?: (sort: GridSort[]) => void;
  rowId: (row: Row) => string;
  /** Where a row leads. */
  rowHref?: (row: Row) => string;
  /** A row as a card, on a phone. */
  card: (row: Row) => ReactNode;
  empty: ReactNode;
  /** "3 sets" below the list. */
  countLabel?: (total: number) => string;
  rowHeight?: number;
  /** A changed value loads the list anew, with the place kept. */
  reloadKey?: string | number;
};
