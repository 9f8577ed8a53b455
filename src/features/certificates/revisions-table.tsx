import type { CertificateRevision } from "@/data/certificates";
import { formatRecordInstant } from "@/format/format-date";
import { DataTable } from "@/ui/layout/data-table";
import type { DataColumn } from "@/ui/layout/data-table-column";
import { CertificateStateMark } from "./certificate-state";

type Props = { revisions: CertificateRevision[]; hrefOf: (certificateId: string) => string; zone: string };

/** Every revision of a certificate: which replaced which, when and why. */
export function RevisionsTable({ revisions, hrefOf, zone }: Props) {
  return (
    <DataTable
      caption="Revisions"
      columns={columnsIn(zone)}
      rows={revisions.toReversed()}
      rowKey={(row) => row.certificateId}
      rowHref={(row) => hrefOf(row.certificateId)}
    />
  );
}

function columnsIn(zone: string): DataColumn<CertificateRevision>[] {
  return [
    { key: "number", head: "Number", cell: (row) => row.number },
    { key: "state", head: "State", cell: (row) => <CertificateStateMark state={row.state} /> },
    { key: "issued", head: "Issued", cell: (row) => formatRecordInstant(row.issuedAt, zone) },
    { key: "by", head: "Released by", cell: (row) => row.releasedBy },
    { key: "why", head: "Why it was issued anew", cell: (row) => row.replacementReason, wrap: true },
    { key: "ended", head: "Why it is no longer current", cell: (row) => row.stateReason, wrap: true },
  ];
}
