import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { authorize } from "@/data/access/authorize";
import { answerPage } from "@/data/edge/answer-page";
import { getSet } from "@/data/sets";
import { CleaningRunForm } from "@/features/cleaning-runs/cleaning-run-form";
import { BenchCautions } from "@/features/cycles/sheet/cautions";
import { plural } from "@/format/plural";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";

export const metadata: Metadata = { title: "Cleaning run" };

export default async function CleaningPage({ params }: PageProps<"/sets/[setId]/cleaning">) {
  const { setId } = await params;
  const context = await currentContext();
  await answerPage(authorize(context, "recordCleaningRun"));
  const { number, injectors } = await answerPage(getSet(context, { setId }));
  const inSet = injectors.filter(({ state }) => state === "in set").length;
  return (
    <>
      <PageHeader
        title={`Cleaning run of set ${number}`}
        subtitle={plural(inSet, "injector")}
        back={<Link href={`/sets/${setId}`}>Set {number}</Link>}
      />
      <div className="flex max-w-3xl flex-col gap-3.5">
        <Sheet>
          <CleaningRunForm setId={setId} number={number} />
        </Sheet>
        <BenchCautions />
      </div>
    </>
  );
}
