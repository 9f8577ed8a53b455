"use client";
import Link from "next/link";
import { useState } from "react";
import { plural } from "../../format/plural";
import { Busy } from "../feedback/busy";
import { Skeleton } from "../feedback/skeleton";
import { Button } from "../form/button";
import { CardSort } from "./card-sort";
import { GridProblem } from "./grid-problem";
import type { GridSort, ServerGridProps } from "./server-grid-types";
import { usePages } from "./use-pages";

/** The same list on a phone: cards, more on demand. */
export function CardList<Row, Filter>(props: ServerGridProps<Row, Filter>) {
  const { label, columns, rowId, rowHref, card, empty, countLabel, onSort } = props;
  const [sort, setSort] = useState<GridSort[]>([...(props.sort ?? [])]);
  const { rows, total, problem, loading, more, retry } = usePages(props, sort);

  function choose(next: GridSort[]) {
    setSort(next);
    onSort?.(next);
  }

  if (total === 0) return <>{empty}</>;
  return (
    <div>
      <CardSort columns={columns} sort={sort} onSort={choose} />
      <ul aria-label={label} className="divide-y divide-hair-2">
        {rows.map((row) => (
          <li key={rowId(row)} className="relative px-4 py-3">
            {rowHref ? (
              <Link href={rowHref(row)} className="block no-underline after:absolute after:inset-0">
                {card(row)}
              </Link>
            ) : (
              card(row)
            )}
          </li>
        ))}
      </ul>
      {problem ? <GridProblem message={problem} onRetry={retry} /> : null}
      {loading && rows.length === 0 ? (
        <Skeleton lines={8} label={`Loading ${label}`} className="px-4 py-5" />
      ) : null}
      {total === null ? null : (
        <div className="flex items-center justify-between gap-3 border-t border-hair-2 px-4 py-2.5">
          <p role="status" className="text-small text-ink-2">
            {rows.length < total
              ? `${rows.length} of ${total}`
              : (countLabel?.(total) ?? plural(total, "row"))}
          </p>
          {loading ? <Busy /> : rows.length < total ? <Button onClick={more}>Show more</Button> : null}
        </div>
      )}
    </div>
  );
}
