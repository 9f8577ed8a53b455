import type { Metadata } from "next";
import { currentContext } from "@/auth/current-actor";
import { answerPage } from "@/data/edge/answer-page";
import { listPeople } from "@/data/people";
import { peopleShown } from "@/data/people/inputs";
import { StatusMark } from "@/ui/feedback/status-mark";
import { ButtonLink } from "@/ui/layout/button-link";
import { DataTable } from "@/ui/layout/data-table";
import { EmptyState } from "@/ui/layout/empty-state";
import { pagerOf, readListPage } from "@/ui/layout/list-page";
import { ListSearch } from "@/ui/layout/list-search";
import { PageHeader } from "@/ui/layout/page-header";
import { Pager } from "@/ui/layout/pager";
import { Sheet } from "@/ui/layout/sheet";
import { Tabs } from "@/ui/layout/tabs";

export const metadata: Metadata = { title: "People" };

export default async function PeoplePage({ searchParams }: PageProps<"/people">) {
  const asked = await searchParams;
  const page = readListPage(asked);
  const shown = peopleShown.find((known) => known === asked.shown) ?? null;
  const { rows, total } = await answerPage(listPeople(await currentContext(), { ...page, shown }));
  return (
    <>
      <PageHeader
        title="People"
        actions={
          <ButtonLink kind="primary" href="/people/new">
            Add a person
          </ButtonLink>
        }
      />
      <Tabs
        label="Which people"
        tabs={[null, ...peopleShown].map((each) => ({
          href: each ? `/people?shown=${each}` : "/people",
          label: each ? `${each[0]!.toUpperCase()}${each.slice(1)}` : "All",
          current: each === shown,
        }))}
      />
      <ListSearch label="Search people" placeholder="Name or e-mail" search={page.search}>
        {shown ? <input type="hidden" name="shown" value={shown} /> : null}
      </ListSearch>
      <Sheet padding="none">
        <DataTable
          caption="People"
          rows={rows}
          rowKey={({ personId }) => personId}
          rowHref={({ personId }) => `/people/${personId}`}
          columns={[
            { key: "name", head: "Name", cell: ({ name }) => name },
            { key: "email", head: "E-mail", cell: ({ email }) => email },
            {
              key: "duties",
              head: "Role",
              cell: ({ roles, actsFor }) =>
                [...roles, ...actsFor.map(({ name }) => `for ${name}`)].join(", ") || "none",
              wrap: true,
            },
            { key: "state", head: "State", cell: stateOf },
            { key: "signIns", head: "Open sign-ins", align: "right", cell: ({ openSignIns }) => openSignIns },
          ]}
          empty={<EmptyState title="Nobody matches">Look among all people, or add one.</EmptyState>}
        />
        <Pager {...pagerOf({ path: "/people", page, shown: rows.length, total }, shown ? { shown } : {})} />
      </Sheet>
    </>
  );
}

type Row = { active: boolean; hasPassword: boolean; linkUntil: Date | null };

function stateOf({ active, hasPassword, linkUntil }: Row) {
  if (!active) return <StatusMark kind="fail">disabled</StatusMark>;
  if (hasPassword) return "can sign in";
  return <StatusMark kind="due">{linkUntil ? "has a set-up link" : "has no password"}</StatusMark>;
}
