import type { GridApi } from "ag-grid-community";
import type { GridSort } from "./server-grid-types";

/** The order that the heads show now. */
export function sortOf(api: GridApi): GridSort[] {
  return api
    .getColumnState()
    .filter(({ sort }) => sort)
    .sort((a, b) => (a.sortIndex ?? 0) - (b.sortIndex ?? 0))
    .map(({ colId, sort }) => ({ column: colId, direction: sort === "desc" ? "desc" : "asc" }));
}
