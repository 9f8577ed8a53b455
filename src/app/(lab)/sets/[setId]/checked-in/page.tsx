import type { Metadata } from "next";
import { currentContext } from "@/auth/current-actor";
import { rolesOf } from "@/data/access/actor";
import { answerPage } from "@/data/edge/answer-page";
import { getLabCard } from "@/data/lab";
import { getSet } from "@/data/sets";
import { PhotosPanel } from "@/features/photos/photos-panel";
import { InjectorsTable } from "@/features/sets/injectors-table";
import { LabelsMenu } from "@/features/sets/labels-menu";
import { formatPromise } from "@/format/format-date";
import { plural } from "@/format/plural";
import { ButtonLink } from "@/ui/layout/button-link";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";

export const metadata: Metadata = { title: "Checked in" };

/** What the counter does next with a set in hand: labels, photos, the next parcel. */
export default async function CheckedInPage({ params }: PageProps<"/sets/[setId]/checked-in">) {
  const { setId } = await params;
  const context = await currentContext();
  const set = await answerPage(getSet(context, { setId }));
  const { clock } = await answerPage(getLabCard(context));
  return (
    <>
      <PageHeader
        title={`Set ${set.number} is checked in`}
        subtitle={`${set.customer.name}, ${plural(set.injectors.length, "injector")}, promised ${formatPromise(set.promisedOn, clock)}`}
        actions={
          <>
            <ButtonLink href={`/sets/${setId}`}>Open the set</ButtonLink>
            <ButtonLink href="/sets/new">Check in the next</ButtonLink>
            <LabelsMenu setId={setId} kind="primary" />
          </>
        }
      />
      <div className="flex flex-col gap-3">
        <Sheet title="Tags" note="one label for each bag" padding="none">
          <InjectorsTable injectors={set.injectors} clock={clock} />
        </Sheet>
        <PhotosPanel set={set} clock={clock} roles={rolesOf(context.actor)} />
      </div>
    </>
  );
}
