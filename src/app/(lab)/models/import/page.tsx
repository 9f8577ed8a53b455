import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { authorize } from "@/data/access/authorize";
import { answerPage } from "@/data/edge/answer-page";
import { ModelImportForm } from "@/features/models/import-form";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";

export const metadata: Metadata = { title: "Import models" };

export default async function ImportModelsPage() {
  await answerPage(authorize(await currentContext(), "importModels"));
  return (
    <>
      <PageHeader title="Import injector models" back={<Link href="/models">Injector models</Link>} />
      <Sheet>
        <ModelImportForm />
      </Sheet>
    </>
  );
}
