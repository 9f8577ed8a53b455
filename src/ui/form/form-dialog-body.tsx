"use client";
import { Dialog } from "radix-ui";
import { buttonStyle } from "../button-style";
import { Form } from "./form";
import type { FormDialogProps } from "./form-dialog-props";
import { HiddenInput } from "./hidden-input";
import type { FormReply } from "./reply";
import { SubmitButton } from "./submit-button";
import { useServerForm } from "./use-server-form";

type Props = Omit<FormDialogProps, "trigger" | "triggerKind" | "triggerSize" | "onDone"> & {
  onDone: (reply: FormReply) => void;
};

export function FormDialogBody(props: Props) {
  const {
    action,
    schema,
    fields = {},
    submitLabel,
    submitKind,
    busyLabel,
    cancelLabel = "Cancel",
    children,
  } = props;
  const form = useServerForm({ action, schema, onDone: props.onDone });
  return (
    <Form form={form} className="mt-3 flex flex-col gap-2.5">
      {Object.entries(fields).map(([name, value]) => (
        <HiddenInput key={name} name={name} value={value} />
      ))}
      {children}
      <div className="flex flex-wrap justify-end gap-2">
        <Dialog.Close className={buttonStyle("plain")}>{cancelLabel}</Dialog.Close>
        <SubmitButton kind={submitKind} busyLabel={busyLabel}>
          {submitLabel}
        </SubmitButton>
      </div>
    </Form>
  );
}
