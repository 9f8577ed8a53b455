import type { CertificateDetail } from "@/data/certificates";
import { formatBytes } from "@/format/format-bytes";
import { formatRecordInstant } from "@/format/format-date";
import { Facts } from "@/ui/layout/facts";
import { Sheet } from "@/ui/layout/sheet";
import { CertificateStateMark } from "./certificate-state";

/** What a certificate says in short, and by what its file is known again. */
export function CertificateSummary({ certificate, zone }: { certificate: CertificateDetail; zone: string }) {
  const { content, state } = certificate;
  const { model, toleranceClass, asLeft } = content;
  return (
    <Sheet title="What it says">
      <Facts
        align="left"
        facts={[
          { label: "State", value: <CertificateStateMark state={state} /> },
          { label: "Issued", value: formatRecordInstant(certificate.issuedAt, zone) },
          { label: "Released by", value: certificate.releasedBy },
          { label: "Model", value: `${model.make} ${model.partNumber}` },
          { label: "Class", value: `${toleranceClass.name}, revision ${toleranceClass.revision}` },
          { label: "Verdict as left", value: asLeft.verdict.verdict ?? "no verdict" },
          { label: "Verification code", value: certificate.verificationCode },
          { label: "PDF", value: formatBytes(certificate.pdfBytes) },
          { label: "SHA-256, PDF", value: <Hash value={certificate.pdfSha256} /> },
          { label: "SHA-256, content", value: <Hash value={certificate.contentSha256} /> },
        ]}
      />
    </Sheet>
  );
}

function Hash({ value }: { value: string }) {
  return <span className="text-small break-all">{value}</span>;
}
