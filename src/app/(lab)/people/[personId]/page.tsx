import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { personIdOf } from "@/data/access/actor";
import { answerPage } from "@/data/edge/answer-page";
import { getPerson } from "@/data/people";
import { PersonSteps, RolesForm } from "@/features/people/person-forms";
import { Notice } from "@/ui/feedback/notice";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";

export const metadata: Metadata = { title: "Person" };

export default async function PersonPage({ params }: PageProps<"/people/[personId]">) {
  const context = await currentContext();
  const person = await answerPage(getPerson(context, await params));
  const isSelf = personIdOf(context.actor) === person.personId;
  return (
    <>
      <PageHeader title={person.name} subtitle={person.email} back={<Link href="/people">People</Link>} />
      {isSelf ? (
        <Notice title="This is your own account.">
          Somebody else who is a lab manager sets your roles. Your password and sign-ins are on your{" "}
          <Link href="/profile">profile</Link>.
        </Notice>
      ) : (
        <div className="flex flex-col gap-3.5">
          <Sheet title="May do">
            <RolesForm person={person} />
          </Sheet>
          <Sheet title="Account" note={person.active ? undefined : "disabled"}>
            <PersonSteps person={person} />
          </Sheet>
        </div>
      )}
    </>
  );
}
