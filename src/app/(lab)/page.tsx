import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { currentContext } from "@/auth/current-actor";
import { rolesOf } from "@/data/access/actor";
import { listBenches } from "@/data/benches";
import { answerPage } from "@/data/edge/answer-page";
import { getLabCard } from "@/data/lab";
import { listSets } from "@/data/sets";
import { BenchesSheet } from "@/features/benches/benches-sheet";
import { SetsSheet } from "@/features/sets/sets-sheet";
import { formatDayOf } from "@/format/format-date";
import { ButtonLink } from "@/ui/layout/button-link";
import { PageHeader } from "@/ui/layout/page-header";

export const metadata: Metadata = { title: "Today" };

const first = { startRow: 0, endRow: 6 };

/** What waits for somebody today: for each role what it can act on comes first. */
export default async function TodayPage() {
  const context = await currentContext();
  const roles = rolesOf(context.actor);
  if (roles.length > 0 && roles.every((role) => role === "customer")) redirect("/my");
  const { clock, name } = await answerPage(getLabCard(context));
  const [late, onHold, leaving, inReview, arrived, benches] = await Promise.all([
    answerPage(listSets(context, { ...first, view: "late" })),
    answerPage(listSets(context, { ...first, view: "on hold" })),
    answerPage(listSets(context, { ...first, view: "ready to leave" })),
    answerPage(listSets(context, { ...first, view: "in the lab", stage: "in review" })),
    answerPage(listSets(context, { ...first, view: "in the lab", stage: "checked in" })),
    answerPage(listBenches(context)),
  ]);
  const at = (view: string) => `/sets?view=${encodeURIComponent(view)}`;
  return (
    <>
      <PageHeader
        title="Today"
        subtitle={`${formatDayOf(clock.now, clock)}, ${name}`}
        actions={
          <>
            {roles.includes("technician") ? (
              <ButtonLink href="/bench" kind="primary">
                To the bench
              </ButtonLink>
            ) : null}
            {roles.includes("counter") ? (
              <ButtonLink href="/sets/new" kind="primary">
                Check in a set
              </ButtonLink>
            ) : null}
          </>
        }
      />
      <div className="grid items-start gap-3.5 laptop:grid-cols-2">
        <div className="flex flex-col gap-3.5">
          {roles.includes("manager") ? (
            <SetsSheet
              title="To review"
              none="Nothing waits for review."
              sets={inReview}
              href="/sets"
              clock={clock}
            />
          ) : null}
          {roles.includes("technician") ? (
            <SetsSheet
              title="Just checked in"
              none="Nothing new."
              sets={arrived}
              href="/bench"
              clock={clock}
            />
          ) : null}
          <SetsSheet
            title="Ready to leave"
            none="Nothing waits to be handed over."
            sets={leaving}
            href={at("ready to leave")}
            clock={clock}
          />
        </div>
        <div className="flex flex-col gap-3.5">
          <SetsSheet title="Late" none="Nothing is late." sets={late} href={at("late")} clock={clock} />
          <SetsSheet
            title="On hold"
            none="Nothing is on hold."
            sets={onHold}
            href={at("on hold")}
            clock={clock}
          />
          <BenchesSheet benches={benches} zone={clock.zone} />
        </div>
      </div>
    </>
  );
}
