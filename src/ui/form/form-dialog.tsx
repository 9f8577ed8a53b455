"use client";
import { Dialog } from "radix-ui";
import { useState } from "react";
import { buttonStyle } from "../button-style";
import { dialogStyle, overlayStyle } from "../layout/dialog-style";
import { FormDialogBody } from "./form-dialog-body";
import type { FormDialogProps } from "./form-dialog-props";
import type { FormReply } from "./reply";

/** A button that opens a form in a dialog. A refusal stays in the dialog and keeps what was typed. */
export function FormDialog({ trigger, triggerKind = "plain", triggerSize, ...props }: FormDialogProps) {
  const [open, setOpen] = useState(false);

  function close(reply: FormReply) {
    setOpen(false);
    props.onDone?.(reply);
  }

  return (
    <Dialog.Root open={open} onOpenChange={setOpen}>
      <Dialog.Trigger className={buttonStyle(triggerKind, triggerSize)}>{trigger}</Dialog.Trigger>
      <Dialog.Portal>
        <Dialog.Overlay className={overlayStyle} />
        <Dialog.Content
          className={dialogStyle}
          {...(props.description ? {} : { "aria-describedby": undefined })}
          // A tap beside it must not throw away what was typed.
          onInteractOutside={(event) => event.preventDefault()}
        >
          <Dialog.Title className="text-large font-semibold">{props.title}</Dialog.Title>
          {props.description ? (
            <Dialog.Description asChild>
              <div className="mt-1 text-ink-2">{props.description}</div>
            </Dialog.Description>
          ) : null}
          <FormDialogBody {...props} onDone={close} />
        </Dialog.Content>
      </Dialog.Portal>
    </Dialog.Root>
  );
}
