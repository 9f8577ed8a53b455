import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { authorize } from "@/data/access/authorize";
import { answerPage } from "@/data/edge/answer-page";
import { getSet } from "@/data/sets";
import { HandOverForm } from "@/features/sets/hand-over-form";
import { plural } from "@/format/plural";
import { Notice } from "@/ui/feedback/notice";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";

export const metadata: Metadata = { title: "Hand over" };

export default async function HandOverPage({ params }: PageProps<"/sets/[setId]/hand-over">) {
  const { setId } = await params;
  const context = await currentContext();
  await answerPage(authorize(context, "handOverSet"));
  const set = await answerPage(getSet(context, { setId }));
  const inSet = set.injectors.filter(({ state }) => state === "in set").length;
  const apart = set.injectors.length - inSet;
  return (
    <>
      <PageHeader
        title={`Hand over set ${set.number}`}
        subtitle={`${set.customer.name}, ${plural(inSet, "injector")}${apart > 0 ? ` and ${apart} rejected` : ""}`}
        back={<Link href={`/sets/${setId}`}>Set {set.number}</Link>}
      />
      <Sheet>
        {set.stage === "returned uncleaned" ? (
          <Notice kind="caution" title="This set leaves without a certificate." className="mb-3">
            {set.course.at(-1)?.reason}
          </Notice>
        ) : null}
        {set.handOver ? (
          <Notice title="It has been handed over already.">
            {set.handOver.takenBy}, {set.handOver.way}
          </Notice>
        ) : (
          <HandOverForm setId={setId} number={set.number} contactName={set.customer.contactName ?? ""} />
        )}
      </Sheet>
    </>
  );
}
