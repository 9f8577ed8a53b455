import { FileDown } from "lucide-react";
import type { CertificateState } from "@/db/vocabulary";
import { type ButtonKind, buttonStyle } from "@/ui/button-style";
import { certificateFileHref } from "./certificate-file-href";

type Props = {
  certificate: { certificateId: string; number: string; state: CertificateState };
  prominent?: boolean;
};

/** The certificate as a PDF and its numbers as files. */
export function CertificateFiles({ certificate, prominent = false }: Props) {
  const files = [
    { kind: "pdf", label: "Certificate, PDF" },
    { kind: "csv", label: "Data sheet, CSV" },
    { kind: "json", label: "Data sheet, JSON" },
  ] as const;
  const style = (kind: string): ButtonKind => (prominent && kind === "pdf" ? "primary" : "plain");
  return (
    <div className="flex flex-wrap gap-2">
      {files.map(({ kind, label }) => (
        <a key={kind} href={certificateFileHref(certificate, kind)} className={buttonStyle(style(kind))}>
          <FileDown aria-hidden="true" size={15} />
          {label}
          <span className="sr-only"> of {certificate.number}</span>
        </a>
      ))}
    </div>
  );
}
