"use client";
import { lazy, Suspense } from "react";
import { Skeleton } from "../feedback/skeleton";
import { CardList } from "./card-list";
import type { ServerGridProps } from "./server-grid-types";
import { useIsPhone } from "./use-is-phone";

// A phone shows cards and need not load the grid at all.
const WideGrid = lazy(() => import("./wide-grid")) as <Row, Filter>(
  props: ServerGridProps<Row, Filter>,
) => React.ReactNode;

/** A long list that the server sorts, filters and pages: a grid where there is room, cards on a phone. */
export function ServerGrid<Row, Filter>(props: ServerGridProps<Row, Filter>) {
  const isPhone = useIsPhone();
  const waiting = <Skeleton lines={8} label={`Loading ${props.label}`} className="px-4 py-5" />;
  if (isPhone === null) return waiting;
  if (isPhone) return <CardList {...props} />;
  return (
    <Suspense fallback={waiting}>
      <WideGrid {...props} />
    </Suspense>
  );
}
