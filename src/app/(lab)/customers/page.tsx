import type { Metadata } from "next";
import { currentContext } from "@/auth/current-actor";
import { listCustomers } from "@/data/customers";
import { answerPage } from "@/data/edge/answer-page";
import { formatDayOf } from "@/format/format-date";
import { noFigure } from "@/format/format-number";
import { ButtonLink } from "@/ui/layout/button-link";
import { DataTable } from "@/ui/layout/data-table";
import { EmptyState } from "@/ui/layout/empty-state";
import { pagerOf, readListPage } from "@/ui/layout/list-page";
import { ListSearch } from "@/ui/layout/list-search";
import { PageHeader } from "@/ui/layout/page-header";
import { Pager } from "@/ui/layout/pager";
import { Sheet } from "@/ui/layout/sheet";
import { labClock } from "../lab-clock";

export const metadata: Metadata = { title: "Customers" };

export default async function CustomersPage({ searchParams }: PageProps<"/customers">) {
  const page = readListPage(await searchParams);
  const context = await currentContext();
  const { rows, total } = await answerPage(listCustomers(context, page));
  const clock = await labClock(context);
  return (
    <>
      <PageHeader
        title="Customers"
        actions={
          <ButtonLink kind="primary" href="/customers/new">
            Add a customer
          </ButtonLink>
        }
      />
      <ListSearch label="Search customers" placeholder="Name" search={page.search} />
      <Sheet padding="none">
        <DataTable
          caption="Customers"
          rows={rows}
          rowKey={({ customerId }) => customerId}
          rowHref={({ customerId }) => `/customers/${customerId}`}
          columns={[
            { key: "name", head: "Name", cell: ({ name }) => name },
            { key: "contact", head: "Contact", cell: ({ contactName }) => contactName || noFigure },
            { key: "phone", head: "Phone", cell: ({ phone }) => phone || noFigure, wideOnly: true },
            { key: "here", head: "Sets here", align: "right", cell: ({ setsHere }) => setsHere },
            { key: "sets", head: "All sets", align: "right", cell: ({ sets }) => sets },
            {
              key: "last",
              head: "Last check-in",
              cell: ({ lastCheckIn }) => formatDayOf(lastCheckIn, clock),
              wideOnly: true,
            },
          ]}
          empty={
            <EmptyState title={page.search ? "No customer matches" : "No customers yet"}>
              A customer can also be added while a set is checked in.
            </EmptyState>
          }
        />
        <Pager {...pagerOf({ path: "/customers", page, shown: rows.length, total })} />
      </Sheet>
    </>
  );
}
