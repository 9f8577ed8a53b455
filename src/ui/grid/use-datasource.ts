"use client";
import type { IDatasource, IGetRowsParams } from "ag-grid-community";
import { useEffect, useMemo, useRef, useState } from "react";
import type { ServerGridProps } from "./server-grid-types";

type Source<Row, Filter> = Pick<ServerGridProps<Row, Filter>, "fetchPage" | "filter" | "reloadKey">;

/** Feeds the grid from the server. A changed filter is another source, so the grid starts at its top. */
export function useDatasource<Row, Filter>({ fetchPage, filter, reloadKey }: Source<Row, Filter>) {
  const [total, setTotal] = useState<number | null>(null);
  const [problem, setProblem] = useState<string | null>(null);
  const [attempt, setAttempt] = useState(0);
  const fetching = useRef(fetchPage);
  useEffect(() => {
    fetching.current = fetchPage;
  }, [fetchPage]);
  const filterText = JSON.stringify(filter);

  // biome-ignore lint/correctness/useExhaustiveDependencies: a new attempt or reload key is a reason to ask again
  const datasource = useMemo<IDatasource>(() => {
    async function getRows({ startRow, endRow, sortModel, successCallback, failCallback }: IGetRowsParams) {
      const sort = sortModel.map(({ colId, sort: direction }) => ({ column: colId, direction }));
      try {
        const page = await fetching.current({ startRow, endRow, sort, filter: JSON.parse(filterText) });
        setTotal(page.total);
        setProblem(null);
        successCallback(page.rows, page.total);
      } catch (error) {
        setProblem(error instanceof Error && error.message ? error.message : "The list could not be loaded.");
        failCallback();
      }
    }
    return { getRows };
  }, [filterText, attempt, reloadKey]);

  return { datasource, total, problem, retry: () => setAttempt((count) => count + 1) };
}
