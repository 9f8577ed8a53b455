"use client";
import { FormDialog } from "./form-dialog";
import type { FormDialogProps } from "./form-dialog-props";
import { TextArea } from "./text-area";

type Props = FormDialogProps & { reasonLabel?: string; reasonHint?: string; reasonName?: string };

/** A step that must say why. */
export function ReasonDialog({
  reasonLabel = "Reason",
  reasonHint = "Stays on the record.",
  reasonName = "reason",
  children,
  ...dialog
}: Props) {
  return (
    <FormDialog {...dialog}>
      {children}
      <TextArea name={reasonName} label={reasonLabel} hint={reasonHint} maxLength={500} />
    </FormDialog>
  );
}
