import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { authorize } from "@/data/access/authorize";
import { answerPage } from "@/data/edge/answer-page";
import { getSet } from "@/data/sets";
import { listToleranceClasses } from "@/data/tolerance-classes";
import { IntakeForm } from "@/features/sets/intake/intake-form";
import { modelOption } from "@/features/sets/intake/search-models";
import { PageHeader } from "@/ui/layout/page-header";

export const metadata: Metadata = { title: "Edit intake" };

export default async function IntakePage({ params }: PageProps<"/sets/[setId]/intake">) {
  const { setId } = await params;
  const context = await currentContext();
  await answerPage(authorize(context, "editIntake"));
  const set = await answerPage(getSet(context, { setId }));
  const classes = await answerPage(listToleranceClasses(context, { withRetired: true }));
  const offered = classes.filter(
    ({ retired, toleranceClassId }) => !retired || toleranceClassId === set.toleranceClass.toleranceClassId,
  );
  return (
    <>
      <PageHeader
        title={`Intake of set ${set.number}`}
        subtitle={set.customer.name}
        back={<Link href={`/sets/${setId}`}>Set {set.number}</Link>}
      />
      <IntakeForm
        set={set}
        model={modelOption(set.model)}
        classes={offered.map(({ toleranceClassId, name }) => ({ value: toleranceClassId, label: name }))}
        needsReason={set.stage !== "checked in"}
      />
    </>
  );
}
