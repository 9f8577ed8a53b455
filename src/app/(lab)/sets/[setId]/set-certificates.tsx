import Link from "next/link";
import type { CertificateRow } from "@/data/certificates";
import { CertificateFiles } from "@/features/certificates/certificate-files";
import { CertificateStateMark } from "@/features/certificates/certificate-state";
import { formatRecordInstant } from "@/format/format-date";
import { Sheet } from "@/ui/layout/sheet";

/** The set's certificates, newest first. The current one offers its files here. */
export function SetCertificates({ certificates, zone }: { certificates: CertificateRow[]; zone: string }) {
  if (certificates.length === 0) return null;
  return (
    <Sheet title="Certificate">
      <ul className="flex flex-col gap-3">
        {certificates.map((certificate) => (
          <li key={certificate.certificateId} className="flex flex-wrap items-center gap-x-4 gap-y-2">
            <Link href={`/certificates/${certificate.certificateId}`} className="font-semibold underline">
              {certificate.number}
            </Link>
            <CertificateStateMark state={certificate.state} />
            <span className="text-ink-2">
              issued {formatRecordInstant(certificate.issuedAt, zone)} by {certificate.releasedBy}
            </span>
            {certificate.state === "current" ? (
              <CertificateFiles certificate={certificate} prominent />
            ) : null}
          </li>
        ))}
      </ul>
    </Sheet>
  );
}
