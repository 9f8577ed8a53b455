"use client";
import { useMemo, useState } from "react";
import type { SetRow } from "@/data/sets";
import type { Clock } from "@/format/calendar";
import { formatDayOf } from "@/format/format-date";
import { plural } from "@/format/plural";
import { RailStrip } from "@/ui/chart/rail-strip";
import { StatusMark } from "@/ui/feedback/status-mark";
import { SearchInput } from "@/ui/form/search-input";
import { ServerGrid } from "@/ui/grid/server-grid";
import type { GridColumn } from "@/ui/grid/server-grid-types";
import { EmptyState } from "@/ui/layout/empty-state";
import { fetchSets } from "./fetch-sets";
import { PromiseWords } from "./promise-words";

type Props = {
  view: string;
  clock: Clock;
  /** What the address asks for. */
  search?: string;
  /** Only this customer's sets; the column of customers is then left out. */
  customerId?: string;
  /** Where a set leads. */
  basePath?: string;
};

/** Sets with their rail strip, stage and promise. */
export function SetList({ view, clock, search: asked = "", customerId, basePath = "/sets" }: Props) {
  const [search, setSearch] = useState(asked);
  const columns = useMemo(() => columnsFor(clock, customerId === undefined), [clock, customerId]);
  const filter = useMemo(() => ({ view, search, customerId }), [view, search, customerId]);
  return (
    <>
      <SearchInput
        label="Search sets"
        placeholder="Number, tag, serial, customer or model"
        value={search}
        onSearch={setSearch}
      />
      <ServerGrid
        label="Sets"
        columns={columns}
        fetchPage={fetchSets}
        filter={filter}
        sort={[
          { column: "promisedOn", direction: view === "handed over" || view === "all" ? "desc" : "asc" },
        ]}
        rowId={({ setId }) => setId}
        rowHref={({ setId }) => `${basePath}/${setId}`}
        rowHeight={52}
        card={(row) => <SetCard row={row} clock={clock} />}
        countLabel={(total) => plural(total, "set")}
        empty={
          <EmptyState title={search ? "No set matches" : "No sets here"}>
            {search ? `Nothing found for “${search}” in this view.` : "Sets appear as they reach this view."}
          </EmptyState>
        }
      />
    </>
  );
}

function columnsFor(clock: Clock, withCustomer: boolean): GridColumn<SetRow>[] {
  return [
    { key: "number", head: "Set", cell: ({ number }) => number, width: 104, sortable: true },
    ...(withCustomer
      ? [
          {
            key: "customer",
            head: "Customer",
            cell: ({ customer }: SetRow) => customer,
            flex: 2,
            sortable: true,
          },
        ]
      : []),
    { key: "model", head: "Model", cell: ({ model }) => model, flex: 1.4, sortable: true },
    { key: "injectors", head: "Injectors", cell: ({ injectors }) => injectors, align: "right", width: 92 },
    { key: "rail", head: "Static flow", cell: Rail, width: 188 },
    { key: "stage", head: "Stage", cell: StageWords, width: 150, sortable: true },
    {
      key: "promisedOn",
      head: "Promised",
      cell: (row) => <PromiseWords set={row} clock={clock} />,
      width: 160,
      sortable: true,
    },
    {
      key: "checkedInAt",
      head: "Checked in",
      cell: ({ checkedInAt }) => formatDayOf(checkedInAt, clock),
      width: 132,
      sortable: true,
    },
  ];
}

function Rail({ rail }: SetRow) {
  if (!rail || !isMeasured(rail)) return <span className="text-small text-ink-2">not measured</span>;
  return <RailStrip size="list" {...rail} />;
}

function isMeasured({ found, left }: NonNullable<SetRow["rail"]>): boolean {
  return [...found, ...left].some((deviation) => deviation !== null);
}

function StageWords({ stage, hold }: SetRow) {
  return hold ? <StatusMark kind="held">on hold, {stage}</StatusMark> : stage;
}

function SetCard({ row, clock }: { row: SetRow; clock: Clock }) {
  return (
    <div className="flex flex-col gap-1">
      <p className="flex flex-wrap items-baseline justify-between gap-x-3">
        <span className="font-semibold">{row.number}</span>
        <StageWords {...row} />
      </p>
      <p>{row.customer}</p>
      <p className="text-small text-ink-2">
        {row.model}, {plural(row.injectors, "injector")}
      </p>
      {row.rail && isMeasured(row.rail) ? <RailStrip size="list" {...row.rail} /> : null}
      <p className="text-small">
        Promised <PromiseWords set={row} clock={clock} />
      </p>
    </div>
  );
}
