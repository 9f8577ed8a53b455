"use client";
import type { ReactNode } from "react";
import { ConflictNotice } from "./conflict-notice";
import { FormContext, type FormField } from "./form-context";
import { FormMessage } from "./form-message";
import { IdempotencyKey } from "./idempotency-key";
import { UnsavedGuard } from "./unsaved-guard";
import type { useServerForm } from "./use-server-form";

// biome-ignore lint/suspicious/noExplicitAny: any form will do here, whatever its schema
type AnyServerForm = ReturnType<typeof useServerForm<any>>;

type Props = {
  form: AnyServerForm;
  /** Asks before typed text is left behind. */
  guard?: boolean;
  /** Off when the page shows FormMessage and ConflictNotice in a place of its own. */
  messages?: boolean;
  className?: string;
  children: ReactNode;
};

/** The form itself, with its key, its messages and, where asked, its guard. */
export function Form({ form: handle, guard = false, messages = true, className, children }: Props) {
  const { form, fields, onSubmit, formAction, pending, reply, idempotencyKey } = handle;
  const state = {
    id: form.id,
    pending,
    reply,
    fieldOf: (name: string) => fieldBelow(fields as Record<string, FormField>, name),
  };
  return (
    <FormContext value={state}>
      <form
        id={form.id}
        action={formAction}
        onSubmit={onSubmit}
        noValidate={form.noValidate}
        aria-busy={pending || undefined}
        className={className ?? "flex flex-col gap-2.5"}
      >
        <IdempotencyKey value={idempotencyKey} />
        {guard ? <UnsavedGuard formId={form.id} saved={reply?.status === "success" ? reply : null} /> : null}
        {messages ? <FormMessage form={handle} /> : null}
        {messages ? <ConflictNotice form={handle} /> : null}
        {children}
      </form>
    </FormContext>
  );
}

/** `customer.name` is the field name of the field customer. */
function fieldBelow(fields: Record<string, FormField>, path: string): FormField | undefined {
  const [first = "", ...rest] = path.split(".");
  const found = fields[first];
  if (!found || rest.length === 0) return found;
  return fieldBelow((found.getFieldset?.() ?? {}) as Record<string, FormField>, rest.join("."));
}
