"use client";
import { type DefaultValue, INTENT } from "@conform-to/dom";
import { useForm } from "@conform-to/react";
import { parseWithZod } from "@conform-to/zod/v4";
import type { FormEvent } from "react";
import type { z } from "zod";
import type { FormAction, FormReply } from "./reply";
import { useSending } from "./use-sending";

type Values<Schema extends z.ZodType> =
  z.input<Schema> extends Record<string, unknown> ? z.input<Schema> : Record<string, unknown>;

type Options<Schema extends z.ZodType> = {
  action: FormAction;
  /** The noun's own input, so that the browser says the same as the server, earlier. */
  schema?: Schema;
  defaultValue?: DefaultValue<Values<Schema>>;
  id?: string;
  /** Called when the server has taken it and the form stays on its page. */
  onDone?: (reply: FormReply) => void;
  /** Empties the form when it is done, ready for the next entry. */
  resetWhenDone?: boolean;
};

export type ServerForm<Schema extends z.ZodType = z.ZodType> = ReturnType<typeof useServerForm<Schema>>;

/** A form whose typed values survive a refusal, for all kinds of fields, with and without a script. */
export function useServerForm<Schema extends z.ZodType>(options: Options<Schema>) {
  const { action, schema, defaultValue, id, onDone, resetWhenDone = false } = options;
  const sending = useSending(action, (reply) => {
    if (reply.status !== "success") return;
    if (resetWhenDone) form.reset();
    onDone?.(reply);
  });
  const [form, fields] = useForm<Values<Schema>, Values<Schema>, string[]>({
    id,
    defaultValue,
    lastResult: sending.reply,
    shouldValidate: "onBlur",
    shouldRevalidate: "onInput",
    // What a person may type as a number or a tick is the schema's business, not the library's.
    onValidate: schema
      ? ({ formData }) => parseWithZod(formData, { schema, disableAutoCoercion: true }) as never
      : undefined,
    onSubmit(event, { formData }) {
      event.preventDefault();
      sending.send(formData);
    },
  });

  function onSubmit(event: FormEvent<HTMLFormElement>) {
    form.onSubmit(event);
    // Adding or removing a row is done here and is no reason to ask the server.
    if (schema && submitterName(event) === INTENT) event.preventDefault();
  }

  return { form, fields, onSubmit, ...sending };
}

function submitterName(event: FormEvent<HTMLFormElement>): string | null {
  const { submitter } = event.nativeEvent as SubmitEvent;
  return submitter?.getAttribute("name") ?? null;
}
