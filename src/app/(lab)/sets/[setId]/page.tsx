import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { personIdOf, rolesOf } from "@/data/access/actor";
import { listCertificates, presentResults } from "@/data/certificates";
import { getSetResults } from "@/data/cycles";
import { answerPage } from "@/data/edge/answer-page";
import { getLabDetails } from "@/data/lab";
import { getSet } from "@/data/sets";
import { verdictCell } from "@/features/results/verdict-cell";
import { SetActions } from "@/features/sets/set-actions";
import { SetHeader } from "@/features/sets/set-header";
import { Section } from "@/ui/layout/section";
import { labClock } from "../../lab-clock";
import { BenchStep } from "./bench-step";
import { SetCertificates } from "./set-certificates";
import { SetRecord } from "./set-record";
import { SetResultsSheets } from "./set-results-sheets";
import { SetReview } from "./set-review";

type Props = PageProps<"/sets/[setId]">;

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { number } = await answerPage(getSet(await currentContext(), await params));
  return { title: `Set ${number}` };
}

/** A set from its intake to its certificate; reads like the certificate will. */
export default async function SetPage({ params }: Props) {
  const { setId } = await params;
  const context = await currentContext();
  const set = await answerPage(getSet(context, { setId }));
  const [results, lab, clock, { rows: certificates }] = await Promise.all([
    answerPage(getSetResults(context, { setId })),
    answerPage(getLabDetails(context)),
    labClock(context),
    answerPage(listCertificates(context, { setId })),
  ]);
  const presented = presentResults(set, results);
  const roles = rolesOf(context.actor);
  return (
    <>
      <SetHeader
        set={set}
        clock={clock}
        back={<Link href="/sets">Sets</Link>}
        actions={<SetActions set={set} roles={roles} />}
        moreCells={verdictCell(presented)}
      />
      <div className="mt-3.5 flex flex-col gap-3.5">
        <BenchStep set={set} results={results} personId={personIdOf(context.actor)} roles={roles} />
        {set.stage === "in review" && roles.includes("manager") ? (
          <SetReview context={context} set={set} results={results} lab={lab} />
        ) : null}
        <SetCertificates certificates={certificates} zone={clock.zone} />
        <SetResultsSheets set={set} presented={presented} results={results} clock={clock} roles={roles} />
      </div>
      <Section title="Record" note="who did what, when and why">
        <SetRecord set={set} results={results} clock={clock} roles={roles} />
      </Section>
    </>
  );
}
