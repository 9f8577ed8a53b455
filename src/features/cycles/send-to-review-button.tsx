"use client";
import { ConfirmDialog } from "@/ui/form/confirm-dialog";
import { sendToReviewAction } from "./actions";

/** The bench's last step; what is missing is said in the dialog. */
export function SendToReviewButton({ setId, number }: { setId: string; number: string }) {
  return (
    <ConfirmDialog
      trigger="Send to review"
      triggerKind="primary"
      title={`Send set ${number} to review`}
      description="The lab manager looks at the results and releases the certificate, or sends the set back."
      action={sendToReviewAction}
      fields={{ setId }}
      submitLabel="Send to review"
      submitKind="primary"
      busyLabel="Sending"
    />
  );
}
