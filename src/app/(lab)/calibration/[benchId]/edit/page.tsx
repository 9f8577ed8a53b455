import type { Metadata } from "next";
import Link from "next/link";
import { notFound } from "next/navigation";
import { currentContext } from "@/auth/current-actor";
import { authorize } from "@/data/access/authorize";
import { getBench } from "@/data/benches";
import { answerPage } from "@/data/edge/answer-page";
import { listFluids } from "@/data/fluids";
import { BenchForm } from "@/features/benches/bench-form";
import { PlaceInstrumentForms } from "@/features/benches/place-instrument-dialogs";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";

export const metadata: Metadata = { title: "Edit bench" };

export default async function EditBenchPage({ params }: PageProps<"/calibration/[benchId]/edit">) {
  const context = await currentContext();
  await answerPage(authorize(context, "editBench"));
  const { detail, ...bench } = await answerPage(getBench(context, await params));
  if (!detail) notFound();
  const fluids = await answerPage(listFluids(context, { withRetired: true }));
  const offered = fluids.filter(({ retired, fluidId }) => !retired || fluidId === detail.fluidId);
  return (
    <>
      <PageHeader
        title={`Edit bench ${bench.code}`}
        back={<Link href={`/calibration/${bench.benchId}`}>Bench {bench.code}</Link>}
      />
      <div className="flex flex-col gap-3.5">
        <Sheet>
          <BenchForm
            bench={{ ...bench, ...detail }}
            fluids={offered.map(({ fluidId, name }) => ({ value: fluidId, label: name }))}
          />
        </Sheet>
        <Sheet title="Instruments" padding="none">
          <PlaceInstrumentForms benchId={bench.benchId} places={detail.places} />
        </Sheet>
      </div>
    </>
  );
}
