import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { authorize } from "@/data/access/authorize";
import { answerPage } from "@/data/edge/answer-page";
import { ClassForm } from "@/features/tolerance-classes/class-form";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";

export const metadata: Metadata = { title: "Add a class" };

export default async function NewClassPage() {
  await answerPage(authorize(await currentContext(), "addToleranceClass"));
  return (
    <>
      <PageHeader
        title="Add a tolerance class"
        back={<Link href="/settings/classes">Tolerance classes</Link>}
      />
      <Sheet>
        <ClassForm known={null} />
      </Sheet>
    </>
  );
}
