import type { Metadata } from "next";
import { currentContext } from "@/auth/current-actor";
import { listBenchQueue } from "@/data/cycles";
import { answerPage } from "@/data/edge/answer-page";
import { BenchQueue } from "@/features/cycles/queue/bench-queue";
import { BenchesNow } from "@/features/cycles/queue/benches-now";
import { PageHeader } from "@/ui/layout/page-header";
import { labClock } from "../lab-clock";

export const metadata: Metadata = { title: "Bench" };

/** What is next, and on which bench it can be done now. */
export default async function BenchPage() {
  const context = await currentContext();
  const { sets, benches } = await answerPage(listBenchQueue(context));
  const clock = await labClock(context);
  return (
    <>
      <PageHeader title="Bench" subtitle="the earliest promise first" />
      <div className="flex flex-col gap-3.5">
        <BenchesNow benches={benches} zone={clock.zone} />
        <BenchQueue sets={sets} clock={clock} />
      </div>
    </>
  );
}
