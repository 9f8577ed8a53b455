"use client";
import { releaseCertificateInput } from "@/data/certificates/inputs";
import { type PaperSize, paperSizes } from "@/db/vocabulary";
import { FormDialog } from "@/ui/form/form-dialog";
import { RadioGroup } from "@/ui/form/radio-group";
import { TextArea } from "@/ui/form/text-area";
import { releaseCertificateAction } from "./actions";
import { type Signing, SigningStatement } from "./signing-statement";

type Props = {
  set: { setId: string; number: string; version: number };
  seen: string;
  paperSize: PaperSize;
  signing: Signing;
};

/** Shows what will be signed before it is. */
export function ReleaseDialog({ set, seen, paperSize, signing }: Props) {
  return (
    <FormDialog
      trigger="Release certificate"
      triggerKind="primary"
      title={`Release the certificate of set ${set.number}`}
      description={<SigningStatement signing={signing} />}
      action={releaseCertificateAction}
      schema={releaseCertificateInput}
      fields={{ setId: set.setId, version: set.version, seen }}
      submitLabel="Sign and release"
      submitKind="primary"
      busyLabel="Releasing"
    >
      <RadioGroup name="paperSize" label="Paper" options={paperSizes} defaultChosen={paperSize} />
      <TextArea name="remarks" label="Remarks" hint="Printed on the certificate." optional />
    </FormDialog>
  );
}
