import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { rolesOf } from "@/data/access/actor";
import { getCycleDraft } from "@/data/cycles";
import { answerPage } from "@/data/edge/answer-page";
import { getSet } from "@/data/sets";
import { CycleSheet } from "@/features/cycles/cycle-sheet";
import { PhotosPanel } from "@/features/photos/photos-panel";
import { PageHeader } from "@/ui/layout/page-header";
import { labClock } from "../../lab-clock";

type Props = PageProps<"/bench/[draftId]">;

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { set, phase } = await answerPage(getCycleDraft(await currentContext(), await params));
  return { title: `${set.number} ${phase}` };
}

/** One cycle of a set on one screen. */
export default async function CyclePage({ params }: Props) {
  const context = await currentContext();
  const draft = await answerPage(getCycleDraft(context, await params));
  const set = await answerPage(getSet(context, { setId: draft.setId }));
  const clock = await labClock(context);
  const { setId, phase, model } = draft;
  return (
    <>
      <PageHeader
        title={`${set.number} ${phase}${draft.corrects ? ", correction" : ""}`}
        subtitle={`${set.customer.name}, ${model.make} ${model.partNumber}`}
        back={
          <>
            <Link href="/bench">Bench</Link>, <Link href={`/sets/${setId}`}>set {set.number}</Link>
          </>
        }
      />
      <CycleSheet
        draft={draft}
        photos={<PhotosPanel set={set} clock={clock} roles={rolesOf(context.actor)} phase={phase} />}
      />
    </>
  );
}
