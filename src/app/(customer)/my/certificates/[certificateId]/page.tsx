import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { getCertificate } from "@/data/certificates";
import { answerPage } from "@/data/edge/answer-page";
import { getLabCard } from "@/data/lab";
import { CertificateFiles } from "@/features/certificates/certificate-files";
import { CertificateNotice } from "@/features/certificates/certificate-notice";
import { CertificateSummary } from "@/features/certificates/certificate-summary";
import { RevisionsTable } from "@/features/certificates/revisions-table";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";

type Props = PageProps<"/my/certificates/[certificateId]">;

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { number } = await answerPage(getCertificate(await currentContext(), await params));
  return { title: `Certificate ${number}` };
}

export default async function MyCertificatePage({ params }: Props) {
  const context = await currentContext();
  const certificate = await answerPage(getCertificate(context, await params));
  const { zone } = (await answerPage(getLabCard(context))).clock;
  const { number, state, revisions, setId, setNumber } = certificate;
  return (
    <>
      <PageHeader
        title={`Certificate ${number}`}
        subtitle={`set ${setNumber}`}
        back={<Link href={`/my/sets/${setId}`}>Set {setNumber}</Link>}
      />
      <div className="flex flex-col gap-3.5">
        <CertificateNotice certificate={certificate} revisions={revisions} zone={zone} />
        <Sheet title="Files">
          <CertificateFiles certificate={certificate} prominent={state === "current"} />
        </Sheet>
        <CertificateSummary certificate={certificate} zone={zone} />
        <Sheet title="Revisions" padding="none">
          <RevisionsTable revisions={revisions} hrefOf={(id) => `/my/certificates/${id}`} zone={zone} />
        </Sheet>
      </div>
    </>
  );
}
