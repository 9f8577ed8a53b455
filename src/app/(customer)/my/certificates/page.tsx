import type { Metadata } from "next";
import { currentContext } from "@/auth/current-actor";
import { listCertificates } from "@/data/certificates";
import { answerPage } from "@/data/edge/answer-page";
import { getLabCard } from "@/data/lab";
import { CertificateStateMark } from "@/features/certificates/certificate-state";
import { formatRecordDayOf } from "@/format/format-date";
import { DataTable } from "@/ui/layout/data-table";
import { EmptyState } from "@/ui/layout/empty-state";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";

export const metadata: Metadata = { title: "My certificates" };

export default async function MyCertificatesPage() {
  const context = await currentContext();
  const { rows } = await answerPage(listCertificates(context, { startRow: 0, endRow: 100 }));
  const { clock } = await answerPage(getLabCard(context));
  return (
    <>
      <PageHeader title="My certificates" />
      <Sheet padding="none">
        <DataTable
          caption="Certificates, newest first"
          rows={rows}
          rowKey={({ certificateId }) => certificateId}
          rowHref={({ certificateId }) => `/my/certificates/${certificateId}`}
          columns={[
            { key: "number", head: "Number", cell: ({ number }) => number },
            { key: "state", head: "State", cell: ({ state }) => <CertificateStateMark state={state} /> },
            { key: "set", head: "Set", cell: ({ setNumber }) => setNumber },
            { key: "model", head: "Model", cell: ({ model }) => model },
            {
              key: "issued",
              head: "Issued",
              cell: ({ issuedAt }) => formatRecordDayOf(issuedAt, clock.zone),
            },
          ]}
          empty={
            <EmptyState title="No certificates yet">They appear when the lab releases a set.</EmptyState>
          }
        />
      </Sheet>
    </>
  );
}
