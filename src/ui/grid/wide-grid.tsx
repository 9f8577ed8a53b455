"use client";
import { AgGridReact } from "ag-grid-react";
import { useRouter } from "next/navigation";
import { useMemo, useState } from "react";
import { plural } from "../../format/plural";
import { columnDefinitions } from "./column-definitions";
import { GridProblem } from "./grid-problem";
import { gridTheme } from "./grid-theme";
import { registerListModules } from "./register-modules";
import type { ServerGridProps } from "./server-grid-types";
import { sortOf } from "./sort-of";
import { useDatasource } from "./use-datasource";

registerListModules();

const headerHeight = 38;
const pageSize = 50;

export default function WideGrid<Row, Filter>(props: ServerGridProps<Row, Filter>) {
  const { label, columns, rowId, rowHref, empty, rowHeight = 40, onSort, sort, countLabel } = props;
  const router = useRouter();
  const { datasource, total, problem, retry } = useDatasource(props);
  const [firstSort] = useState(sort);
  const definitions = useMemo(
    () => columnDefinitions(columns, { rowHref, sort: firstSort }),
    [columns, rowHref, firstSort],
  );

  function open(row: Row | undefined) {
    if (row && rowHref) router.push(rowHref(row));
  }

  if (total === 0 && !problem) return <>{empty}</>;
  const rows = Math.max(1, Math.min(total ?? 8, pageSize));
  return (
    <div>
      {problem ? <GridProblem message={problem} onRetry={retry} /> : null}
      <div
        style={{ height: headerHeight + rows * rowHeight + 2 }}
        className="max-h-[calc(100dvh-14rem)] min-h-56"
      >
        <AgGridReact<Row>
          theme={gridTheme}
          rowModelType="infinite"
          datasource={datasource}
          cacheBlockSize={pageSize}
          maxBlocksInCache={20}
          infiniteInitialRowCount={rows}
          maxConcurrentDatasourceRequests={2}
          blockLoadDebounceMillis={80}
          columnDefs={definitions}
          getRowId={({ data }) => rowId(data)}
          rowHeight={rowHeight}
          headerHeight={headerHeight}
          suppressCellFocus={!rowHref}
          suppressMovableColumns
          suppressMultiSort={false}
          animateRows={false}
          onSortChanged={({ api }) => onSort?.(sortOf(api))}
          onRowClicked={({ data, event }) => isPlainClick(event) && open(data)}
          onCellKeyDown={({ data, event }) => (event as KeyboardEvent | null)?.key === "Enter" && open(data)}
          rowStyle={rowHref ? { cursor: "pointer" } : undefined}
          {...{ "aria-label": label }}
        />
      </div>
      <p role="status" className="border-t border-hair-2 px-4 py-2 text-small text-ink-2">
        {total === null ? "Loading" : (countLabel?.(total) ?? plural(total, "row"))}
      </p>
    </div>
  );
}

/** A click on the link inside the row is the link's own. */
function isPlainClick(event: Event | null | undefined): boolean {
  return (
    event instanceof MouseEvent && !(event.target instanceof Element && event.target.closest("a, button"))
  );
}
