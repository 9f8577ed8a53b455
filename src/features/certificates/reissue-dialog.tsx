"use client";
import { reissueCertificateInput } from "@/data/certificates/inputs";
import { type PaperSize, paperSizes } from "@/db/vocabulary";
import { RadioGroup } from "@/ui/form/radio-group";
import { ReasonDialog } from "@/ui/form/reason-dialog";
import { TextArea } from "@/ui/form/text-area";
import { reissueCertificateAction } from "./actions";
import { type Signing, SigningStatement } from "./signing-statement";

type Props = {
  certificate: { certificateId: string; number: string; remarks: string };
  version: number;
  seen: string;
  paperSize: PaperSize;
  signing: Signing;
};

/** A new revision from the record as it stands now; the old one is named by it and stays on record. */
export function ReissueDialog({ certificate, version, seen, paperSize, signing }: Props) {
  return (
    <ReasonDialog
      trigger="Reissue"
      title={`Issue a new revision of ${certificate.number}`}
      description={<SigningStatement signing={signing} />}
      action={reissueCertificateAction}
      schema={reissueCertificateInput}
      fields={{ certificateId: certificate.certificateId, version, seen }}
      submitLabel="Sign and reissue"
      submitKind="primary"
      busyLabel="Reissuing"
      reasonLabel="Reason for the new revision"
      reasonHint="Printed on the new revision."
    >
      <RadioGroup name="paperSize" label="Paper" options={paperSizes} defaultChosen={paperSize} />
      <TextArea
        name="remarks"
        label="Remarks"
        hint="Printed on the certificate."
        defaultValue={certificate.remarks}
        optional
      />
    </ReasonDialog>
  );
}
