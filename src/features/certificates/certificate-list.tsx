"use client";
import { useMemo, useState } from "react";
import type { CertificateRow } from "@/data/certificates";
import type { Clock } from "@/format/calendar";
import { formatDayOf } from "@/format/format-date";
import { plural } from "@/format/plural";
import { SearchInput } from "@/ui/form/search-input";
import { ServerGrid } from "@/ui/grid/server-grid";
import type { GridColumn, PageOfRows, PageRequest } from "@/ui/grid/server-grid-types";
import { EmptyState } from "@/ui/layout/empty-state";
import { CertificateStateMark } from "./certificate-state";

type Filter = { state: string; search: string };

/** Certificates, newest first. */
export function CertificateList({ state, clock }: { state: string; clock: Clock }) {
  const [search, setSearch] = useState("");
  const columns = useMemo(() => columnsFor(clock), [clock]);
  const filter = useMemo(() => ({ state, search }), [state, search]);
  return (
    <>
      <SearchInput
        label="Search certificates"
        placeholder="Number, set or customer"
        value={search}
        onSearch={setSearch}
      />
      <ServerGrid
        label="Certificates"
        columns={columns}
        fetchPage={fetchCertificates}
        filter={filter}
        sort={[{ column: "issuedAt", direction: "desc" }]}
        rowId={({ certificateId }) => certificateId}
        rowHref={({ certificateId }) => `/certificates/${certificateId}`}
        card={(row) => <CertificateCard row={row} clock={clock} />}
        countLabel={(total) => plural(total, "certificate")}
        empty={
          <EmptyState title={search ? "No certificate matches" : "No certificates here"}>
            They appear when the lab manager releases a set.
          </EmptyState>
        }
      />
    </>
  );
}

async function fetchCertificates(request: PageRequest<Filter>): Promise<PageOfRows<CertificateRow>> {
  const { startRow, endRow, sort, filter } = request;
  const query = new URLSearchParams({
    startRow: String(startRow),
    endRow: String(endRow),
    search: filter.search,
  });
  if (filter.state) query.set("state", filter.state);
  if (sort[0]) {
    query.set("sort", sort[0].column);
    query.set("descending", String(sort[0].direction === "desc"));
  }
  const response = await fetch(`/api/data/certificates?${query}`);
  if (!response.ok) throw new Error(`The list of certificates answered ${response.status}`);
  return response.json();
}

function columnsFor(clock: Clock): GridColumn<CertificateRow>[] {
  return [
    { key: "number", head: "Number", cell: ({ number }) => number, width: 128, sortable: true },
    { key: "state", head: "State", cell: ({ state }) => <CertificateStateMark state={state} />, width: 130 },
    { key: "set", head: "Set", cell: ({ setNumber }) => setNumber, width: 104, sortable: true },
    { key: "customer", head: "Customer", cell: ({ customer }) => customer, flex: 1.6, sortable: true },
    { key: "model", head: "Model", cell: ({ model }) => model, flex: 1.2 },
    {
      key: "issuedAt",
      head: "Issued",
      cell: ({ issuedAt }) => formatDayOf(issuedAt, clock),
      width: 150,
      sortable: true,
    },
    { key: "releasedBy", head: "Released by", cell: ({ releasedBy }) => releasedBy, width: 140 },
  ];
}

function CertificateCard({ row, clock }: { row: CertificateRow; clock: Clock }) {
  return (
    <div className="flex flex-col gap-1">
      <p className="flex flex-wrap items-baseline justify-between gap-x-3">
        <span className="font-semibold">{row.number}</span>
        <CertificateStateMark state={row.state} />
      </p>
      <p>
        Set {row.setNumber}, {row.customer}
      </p>
      <p className="text-small text-ink-2">
        {row.model}, issued {formatDayOf(row.issuedAt, clock)}
      </p>
    </div>
  );
}
