import type { Metadata } from "next";
import { currentContext } from "@/auth/current-actor";
import { listCertificates } from "@/data/certificates";
import { answerPage } from "@/data/edge/answer-page";
import { certificateStates } from "@/db/vocabulary";
import { CertificateList } from "@/features/certificates/certificate-list";
import { PageHeader } from "@/ui/layout/page-header";
import { Tabs } from "@/ui/layout/tabs";
import { labClock } from "../lab-clock";

export const metadata: Metadata = { title: "Certificates" };

export default async function CertificatesPage({ searchParams }: PageProps<"/certificates">) {
  const { state: asked } = await searchParams;
  const state = certificateStates.find((known) => known === asked) ?? "";
  const context = await currentContext();
  const clock = await labClock(context);
  await answerPage(listCertificates(context, { startRow: 0, endRow: 1 }));
  return (
    <>
      <PageHeader title="Certificates" />
      <Tabs
        label="Which certificates"
        tabs={["", ...certificateStates].map((each) => ({
          href: each ? `/certificates?state=${each}` : "/certificates",
          label: each ? `${each[0]!.toUpperCase()}${each.slice(1)}` : "All",
          current: each === state,
        }))}
      />
      <CertificateList key={state} state={state} clock={clock} />
    </>
  );
}
