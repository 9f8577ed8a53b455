import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { authorize } from "@/data/access/authorize";
import { answerPage } from "@/data/edge/answer-page";
import { ModelForm } from "@/features/models/model-form";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";

export const metadata: Metadata = { title: "New model" };

export default async function NewModelPage() {
  await answerPage(authorize(await currentContext(), "addModel"));
  return (
    <>
      <PageHeader title="New injector model" back={<Link href="/models">Injector models</Link>} />
      <Sheet>
        <ModelForm model={null} />
      </Sheet>
    </>
  );
}
