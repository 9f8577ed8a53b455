"use client";
import { useEffect, useEffectEvent, useState } from "react";
import type { GridSort, ServerGridProps } from "./server-grid-types";

type Source<Row, Filter> = Pick<ServerGridProps<Row, Filter>, "fetchPage" | "filter" | "reloadKey">;
type State<Row> = { rows: Row[]; total: number | null; problem: string | null; loading: boolean };

const pageSize = 25;

/** The list page after page, for cards. */
export function usePages<Row, Filter>(
  { fetchPage, filter, reloadKey }: Source<Row, Filter>,
  sort: GridSort[],
) {
  const start: State<Row> = { rows: [], total: null, problem: null, loading: true };
  const [state, setState] = useState(start);
  const question = JSON.stringify([filter, sort, reloadKey]);

  const load = useEffectEvent(async (from: number, isWanted: () => boolean) => {
    setState((now) => ({ ...(from === 0 ? start : now), loading: true, problem: null }));
    try {
      const page = await fetchPage({ startRow: from, endRow: from + pageSize, sort, filter });
      if (!isWanted()) return;
      setState((now) => ({
        rows: [...(from === 0 ? [] : now.rows), ...page.rows],
        total: page.total,
        problem: null,
        loading: false,
      }));
    } catch (error) {
      if (!isWanted()) return;
      const problem =
        error instanceof Error && error.message ? error.message : "The list could not be loaded.";
      setState((now) => ({ ...now, problem, loading: false }));
    }
  });

  const [wanted, setWanted] = useState({ question, from: 0, attempt: 0 });
  if (wanted.question !== question) setWanted({ question, from: 0, attempt: 0 });
  useEffect(() => {
    let current = true;
    void load(wanted.from, () => current);
    return () => {
      current = false;
    };
  }, [wanted]);

  return {
    ...state,
    more: () => setWanted((now) => ({ ...now, from: state.rows.length })),
    retry: () => setWanted((now) => ({ ...now, attempt: now.attempt + 1 })),
  };
}
