import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { rolesOf } from "@/data/access/actor";
import { getCertificate } from "@/data/certificates";
import { answerPage } from "@/data/edge/answer-page";
import { CertificateFiles } from "@/features/certificates/certificate-files";
import { CertificateNotice } from "@/features/certificates/certificate-notice";
import { CertificateSummary } from "@/features/certificates/certificate-summary";
import { RevisionsTable } from "@/features/certificates/revisions-table";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";
import { labClock } from "../../lab-clock";
import { CertificateSteps } from "./certificate-steps";

type Props = PageProps<"/certificates/[certificateId]">;

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { number } = await answerPage(getCertificate(await currentContext(), await params));
  return { title: `Certificate ${number}` };
}

/** A certificate: its state first, then its files, what it says in short, and its other revisions. */
export default async function CertificatePage({ params }: Props) {
  const context = await currentContext();
  const certificate = await answerPage(getCertificate(context, await params));
  const { zone } = await labClock(context);
  const { content, number, state, revisions, setId, setNumber } = certificate;
  return (
    <>
      <PageHeader
        title={`Certificate ${number}`}
        subtitle={`${content.customer.name}, set ${setNumber}`}
        back={
          <>
            <Link href="/certificates">Certificates</Link>,{" "}
            <Link href={`/sets/${setId}`}>set {setNumber}</Link>
          </>
        }
        actions={
          state !== "superseded" && rolesOf(context.actor).includes("manager") ? (
            <CertificateSteps context={context} certificate={certificate} />
          ) : null
        }
      />
      <div className="flex flex-col gap-3.5">
        <CertificateNotice certificate={certificate} revisions={revisions} zone={zone} />
        <Sheet title="Files">
          <CertificateFiles certificate={certificate} prominent={state === "current"} />
        </Sheet>
        <CertificateSummary certificate={certificate} zone={zone} />
        <Sheet title="Revisions" padding="none">
          <RevisionsTable revisions={revisions} hrefOf={(id) => `/certificates/${id}`} zone={zone} />
        </Sheet>
      </div>
    </>
  );
}
