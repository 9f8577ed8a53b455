import type { Metadata } from "next";
import { currentContext } from "@/auth/current-actor";
import { rolesOf } from "@/data/access/actor";
import { answerPage } from "@/data/edge/answer-page";
import { getLabCard } from "@/data/lab";
import { countSets } from "@/data/sets";
import { setViews } from "@/data/sets/inputs";
import { SetList } from "@/features/sets/set-list";
import { ButtonLink } from "@/ui/layout/button-link";
import { PageHeader } from "@/ui/layout/page-header";
import { Tabs } from "@/ui/layout/tabs";

export const metadata: Metadata = { title: "Sets" };

const names: Record<(typeof setViews)[number], string> = {
  "in the lab": "In the lab",
  late: "Late",
  "on hold": "On hold",
  "ready to leave": "Ready to leave",
  "handed over": "Handed over",
  all: "All",
};

export default async function SetsPage({ searchParams }: PageProps<"/sets">) {
  const { view: asked, search } = await searchParams;
  const view = setViews.find((known) => known === asked) ?? "in the lab";
  const context = await currentContext();
  const { clock } = await answerPage(getLabCard(context));
  const counts = await answerPage(countSets(context));
  const roles = rolesOf(context.actor);
  return (
    <>
      <PageHeader
        title="Sets"
        actions={
          roles.includes("counter") || roles.includes("manager") ? (
            <ButtonLink kind="primary" href="/sets/new">
              Check in a set
            </ButtonLink>
          ) : null
        }
      />
      <Tabs
        label="Which sets"
        tabs={setViews.map((each) => ({
          href: each === "in the lab" ? "/sets" : `/sets?view=${encodeURIComponent(each)}`,
          label: names[each],
          count: counts[each],
          current: each === view,
        }))}
      />
      <SetList key={view} view={view} clock={clock} search={typeof search === "string" ? search : ""} />
    </>
  );
}
