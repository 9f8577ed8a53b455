import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { authorize } from "@/data/access/authorize";
import { answerPage } from "@/data/edge/answer-page";
import { AddPersonForm } from "@/features/people/add-person-form";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";

export const metadata: Metadata = { title: "Add a person" };

export default async function AddPersonPage() {
  await answerPage(authorize(await currentContext(), "addPerson"));
  return (
    <>
      <PageHeader title="Add a person" back={<Link href="/people">People</Link>} />
      <Sheet>
        <AddPersonForm />
      </Sheet>
    </>
  );
}
