"use client";
import { sendBackSetInput } from "@/data/certificates/inputs";
import { ReasonDialog } from "@/ui/form/reason-dialog";
import { sendBackSetAction } from "./actions";

type Props = { set: { setId: string; number: string; version: number }; seen: string };

export function SendBackDialog({ set, seen }: Props) {
  return (
    <ReasonDialog
      trigger="Send back"
      title={`Send set ${set.number} back to the bench`}
      description="It becomes “as left” again, so that it can be corrected, measured or cleaned once more."
      action={sendBackSetAction}
      schema={sendBackSetInput}
      fields={{ setId: set.setId, version: set.version, seen }}
      submitLabel="Send back"
      submitKind="primary"
      busyLabel="Sending back"
      reasonHint="The technician reads it; it stays in the course of the set."
    />
  );
}
