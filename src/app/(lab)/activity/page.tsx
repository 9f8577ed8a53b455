import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { listActivity } from "@/data/activity";
import { events } from "@/data/audit/events";
import { answerPage } from "@/data/edge/answer-page";
import { listPeople } from "@/data/people";
import { ActivityFilter } from "@/features/activity/activity-filter";
import { Changes } from "@/features/activity/changes";
import { formatRecordInstant } from "@/format/format-date";
import { DataTable } from "@/ui/layout/data-table";
import { EmptyState } from "@/ui/layout/empty-state";
import { pagerOf, readListPage } from "@/ui/layout/list-page";
import { PageHeader } from "@/ui/layout/page-header";
import { Pager } from "@/ui/layout/pager";
import { Sheet } from "@/ui/layout/sheet";
import { labClock } from "../lab-clock";

export const metadata: Metadata = { title: "Activity" };

const filters = ["personId", "event", "from", "until", "setId"] as const;

/** The activity record, newest first: nobody writes, changes or removes it here. */
export default async function ActivityPage({ searchParams }: PageProps<"/activity">) {
  const asked = await searchParams;
  const page = readListPage(asked);
  const chosen = Object.fromEntries(
    filters.flatMap((name) => (typeof asked[name] === "string" && asked[name] ? [[name, asked[name]]] : [])),
  ) as Record<string, string>;
  const context = await currentContext();
  const { rows, total } = await answerPage(listActivity(context, { ...page, ...chosen }));
  const people = await answerPage(listPeople(context, { startRow: 0, endRow: 100 }));
  const { zone } = await labClock(context);
  return (
    <>
      <PageHeader
        title="Activity"
        subtitle="every change, refusal and sign-in; chained, so that nothing can be taken out"
      />
      <ActivityFilter
        chosen={chosen}
        events={events}
        people={people.rows.map(({ personId, name }) => ({ value: personId, label: name }))}
      />
      <Sheet padding="none">
        <DataTable
          caption="Activity, newest first"
          dense
          rows={rows}
          rowKey={({ position }) => String(position)}
          columns={[
            { key: "event", head: "What", cell: ({ event }) => event },
            { key: "object", head: "Of", cell: ({ objectName }) => objectName },
            { key: "who", head: "Who", cell: ({ personName, actor }) => personName ?? actor },
            { key: "at", head: "When", cell: ({ at }) => formatRecordInstant(at, zone) },
            {
              key: "set",
              head: "Set",
              cell: ({ setId, setNumber }) =>
                setId ? <Link href={`/sets/${setId}`}>{setNumber}</Link> : null,
            },
            { key: "reason", head: "Reason", cell: ({ reason }) => reason, wrap: true },
            {
              key: "changes",
              head: "Before and after",
              cell: ({ before, after }) => <Changes before={before} after={after} />,
              wrap: true,
            },
            { key: "position", head: "No.", align: "right", cell: ({ position }) => position },
          ]}
          empty={<EmptyState title="Nothing matches">Take a filter away.</EmptyState>}
        />
        <Pager {...pagerOf({ path: "/activity", page, shown: rows.length, total }, chosen)} />
      </Sheet>
    </>
  );
}
