import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { listCertificates, presentResults } from "@/data/certificates";
import { getSetResults } from "@/data/cycles";
import { answerPage } from "@/data/edge/answer-page";
import { getLabCard } from "@/data/lab";
import { getSet } from "@/data/sets";
import { CertificateFiles } from "@/features/certificates/certificate-files";
import { CertificateStateMark } from "@/features/certificates/certificate-state";
import { PhotosPanel } from "@/features/photos/photos-panel";
import { CourseList } from "@/features/results/course-list";
import { Pictures } from "@/features/results/pictures";
import { ResultsDetail, ResultsHead } from "@/features/results/results-sheets";
import { verdictCell } from "@/features/results/verdict-cell";
import { InjectorsTable } from "@/features/sets/injectors-table";
import { SetHeader } from "@/features/sets/set-header";
import { EmptyState } from "@/ui/layout/empty-state";
import { Sheet } from "@/ui/layout/sheet";

type Props = PageProps<"/my/sets/[setId]">;

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { number } = await answerPage(getSet(await currentContext(), await params));
  return { title: `Set ${number}` };
}

/** A set as its customer sees it: its course at once, the figures once they are certified. */
export default async function MySetPage({ params }: Props) {
  const { setId } = await params;
  const context = await currentContext();
  const set = await answerPage(getSet(context, { setId }));
  const { clock, phone, email } = await answerPage(getLabCard(context));
  const { rows: certificates } = await answerPage(listCertificates(context, { setId }));
  const results =
    certificates.length > 0 ? presentResults(set, await answerPage(getSetResults(context, { setId }))) : null;
  return (
    <>
      <SetHeader
        set={set}
        clock={clock}
        back={<Link href="/my">My sets</Link>}
        moreCells={results ? verdictCell(results) : []}
      />
      <div className="mt-3.5 flex flex-col gap-3.5">
        {certificates.map((certificate) => (
          <Sheet key={certificate.certificateId} title={`Certificate ${certificate.number}`}>
            <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
              <CertificateStateMark state={certificate.state} />
              <Link href={`/my/certificates/${certificate.certificateId}`} className="underline">
                What it says
              </Link>
              {certificate.state === "current" ? (
                <CertificateFiles certificate={certificate} prominent />
              ) : null}
            </div>
          </Sheet>
        ))}
        {results ? (
          <>
            <ResultsHead results={results} zone={clock.zone} />
            <Pictures results={results} />
            <ResultsDetail results={results} />
          </>
        ) : (
          <Sheet>
            <EmptyState title="The figures come with the certificate">
              Until then you see here how far the set is. Questions:{" "}
              {[phone, email].filter(Boolean).join(", ")}
            </EmptyState>
          </Sheet>
        )}
        <PhotosPanel set={set} clock={clock} roles={["customer"]} />
        <Sheet title="Injectors" padding="none">
          <InjectorsTable injectors={set.injectors} clock={clock} linkVisits={false} />
        </Sheet>
        <Sheet title="Course" padding="none">
          <CourseList set={set} zone={clock.zone} />
        </Sheet>
      </div>
    </>
  );
}
