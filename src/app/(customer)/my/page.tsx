import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { answerPage } from "@/data/edge/answer-page";
import { getLabCard } from "@/data/lab";
import { listSets, type SetRow } from "@/data/sets";
import { isOpenStage } from "@/db/vocabulary";
import { PromiseWords } from "@/features/sets/promise-words";
import type { Clock } from "@/format/calendar";
import { formatDayOf } from "@/format/format-date";
import { plural } from "@/format/plural";
import { RailStrip } from "@/ui/chart/rail-strip";
import { StatusMark } from "@/ui/feedback/status-mark";
import { EmptyState } from "@/ui/layout/empty-state";
import { pagerOf, readListPage } from "@/ui/layout/list-page";
import { PageHeader } from "@/ui/layout/page-header";
import { Pager } from "@/ui/layout/pager";
import { Sheet } from "@/ui/layout/sheet";

export const metadata: Metadata = { title: "My sets" };

/** A customer's own sets, newest first. No grid: this page is read on phones. */
export default async function MySetsPage({ searchParams }: PageProps<"/my">) {
  const page = readListPage({ page: (await searchParams).page });
  const context = await currentContext();
  const { rows, total } = await answerPage(
    listSets(context, {
      view: "all",
      sort: "checkedInAt",
      descending: "true",
      startRow: page.startRow,
      endRow: page.endRow,
    }),
  );
  const { name, phone, clock } = await answerPage(getLabCard(context));
  return (
    <>
      <PageHeader title="My sets" subtitle={[`at ${name}`, phone].filter(Boolean).join(", ")} />
      <Sheet padding="none">
        {rows.length === 0 ? (
          <EmptyState title="No sets yet">
            They appear here as soon as the lab has checked them in.
          </EmptyState>
        ) : (
          <ul className="divide-y divide-hair-2">
            {rows.map((row) => (
              <li key={row.setId}>
                <SetLine row={row} clock={clock} />
              </li>
            ))}
          </ul>
        )}
        {total > rows.length ? (
          <Pager {...pagerOf({ path: "/my", page, shown: rows.length, total })} />
        ) : null}
      </Sheet>
    </>
  );
}

function SetLine({ row, clock }: { row: SetRow; clock: Clock }) {
  const { rail, stage, hold } = row;
  return (
    <Link
      href={`/my/sets/${row.setId}`}
      className="grid gap-x-6 gap-y-1.5 px-4 py-3.5 no-underline hover:bg-raised tablet:grid-cols-[1fr_13rem_11rem] tablet:items-center"
    >
      <span className="min-w-0">
        <span className="font-semibold">{row.number}</span> {row.model}
        <span className="block text-small text-ink-2">
          {plural(row.injectors, "injector")}, checked in {formatDayOf(row.checkedInAt, clock)}
        </span>
      </span>
      <span>{rail ? <RailStrip size="list" {...rail} /> : null}</span>
      <span>
        {hold ? <StatusMark kind="held">on hold, {stage}</StatusMark> : stage}
        {isOpenStage(stage) ? (
          <span className="block text-small">
            promised <PromiseWords set={row} clock={clock} />
          </span>
        ) : null}
      </span>
    </Link>
  );
}
