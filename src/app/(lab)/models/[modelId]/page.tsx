import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { authorize } from "@/data/access/authorize";
import { answerPage } from "@/data/edge/answer-page";
import { getModel } from "@/data/models";
import { ModelForm } from "@/features/models/model-form";
import { plural } from "@/format/plural";
import { Notice } from "@/ui/feedback/notice";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";

export const metadata: Metadata = { title: "Injector model" };

export default async function ModelPage({ params }: PageProps<"/models/[modelId]">) {
  const context = await currentContext();
  await answerPage(authorize(context, "editModel"));
  const model = await answerPage(getModel(context, await params));
  return (
    <>
      <PageHeader
        title={`${model.make} ${model.partNumber}`}
        subtitle={`in ${plural(model.sets, "set")}`}
        back={<Link href="/models">Injector models</Link>}
      />
      <div className="flex flex-col gap-3.5">
        {model.confirmed ? null : (
          <Notice kind="caution" title="Entered at the counter">
            Look at its figures against the maker's; saving confirms them.
          </Notice>
        )}
        <Sheet note="Sets that are certified keep the figures they were judged by.">
          <ModelForm model={model} />
        </Sheet>
      </div>
    </>
  );
}
