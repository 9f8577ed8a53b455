import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { authorize } from "@/data/access/authorize";
import { answerPage } from "@/data/edge/answer-page";
import { listFluids } from "@/data/fluids";
import { BenchForm } from "@/features/benches/bench-form";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";

export const metadata: Metadata = { title: "Add a bench" };

export default async function AddBenchPage() {
  const context = await currentContext();
  await answerPage(authorize(context, "addBench"));
  const fluids = await answerPage(listFluids(context));
  return (
    <>
      <PageHeader title="Add a bench" back={<Link href="/calibration">Calibration</Link>} />
      <Sheet>
        <BenchForm
          bench={null}
          fluids={fluids.map(({ fluidId, name }) => ({ value: fluidId, label: name }))}
        />
      </Sheet>
    </>
  );
}
