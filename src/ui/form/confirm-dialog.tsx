"use client";
import { FormDialog } from "./form-dialog";
import type { FormDialogProps } from "./form-dialog-props";

/** Asks before a step that cannot be taken back, with the name of the thing in its title. */
export function ConfirmDialog({ submitKind = "danger", ...dialog }: FormDialogProps) {
  return <FormDialog submitKind={submitKind} {...dialog} />;
}
