import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { authorize } from "@/data/access/authorize";
import { answerPage } from "@/data/edge/answer-page";
import { getToleranceClass } from "@/data/tolerance-classes";
import { ClassForm } from "@/features/tolerance-classes/class-form";
import { formatRecordInstant } from "@/format/format-date";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";
import { labClock } from "../../../lab-clock";

export const metadata: Metadata = { title: "Tolerance class" };

export default async function ClassPage({ params }: PageProps<"/settings/classes/[toleranceClassId]">) {
  const context = await currentContext();
  await answerPage(authorize(context, "reviseToleranceClass"));
  const known = await answerPage(getToleranceClass(context, await params));
  const { zone } = await labClock(context);
  const [latest] = known.revisions;
  return (
    <>
      <PageHeader
        title={`Class ${known.name}`}
        subtitle={`revision ${latest?.revision ?? 0}`}
        back={<Link href="/settings/classes">Tolerance classes</Link>}
      />
      <div className="flex flex-col gap-3.5">
        {latest ? (
          <Sheet title="Limits" note="sets that are in review are judged by the new revision at once">
            <ClassForm known={{ ...known, latest }} />
          </Sheet>
        ) : null}
        <Sheet title="Revisions">
          <ul className="flex flex-col gap-1">
            {known.revisions.map(({ revisionId, revision, recordedBy, recordedAt }) => (
              <li key={revisionId}>
                Revision {revision}, {recordedBy}, {formatRecordInstant(recordedAt, zone)}
              </li>
            ))}
          </ul>
        </Sheet>
      </div>
    </>
  );
}
