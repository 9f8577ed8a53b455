"use client";
import { revokeCertificateInput } from "@/data/certificates/inputs";
import { ReasonDialog } from "@/ui/form/reason-dialog";
import { revokeCertificateAction } from "./actions";

type Props = { certificate: { certificateId: string; number: string } };

export function RevokeDialog({ certificate: { certificateId, number } }: Props) {
  return (
    <ReasonDialog
      trigger="Revoke"
      title={`Revoke certificate ${number}`}
      description="It can no longer be relied on, and that cannot be taken back. The set is not handed over before a new revision is issued. The file stays on record, marked as revoked wherever it is offered."
      action={revokeCertificateAction}
      schema={revokeCertificateInput}
      fields={{ certificateId }}
      submitLabel={`Revoke ${number}`}
      submitKind="danger"
      busyLabel="Revoking"
      reasonHint="Shown to everybody who opens the certificate, the customer included."
    />
  );
}
