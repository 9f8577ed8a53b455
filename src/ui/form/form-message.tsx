"use client";
import { type MouseEvent, useEffect, useRef } from "react";
import { plural } from "../../format/plural";
import { Notice } from "../feedback/notice";
import type { ServerForm } from "./use-server-form";

// biome-ignore lint/suspicious/noExplicitAny: any form will do here, whatever its schema
type Props = { form: ServerForm<any> };

/** What the form as a whole has to say: why it was refused, which fields need attention, or that it is done. */
export function FormMessage({ form: { form, reply } }: Props) {
  const place = useRef<HTMLDivElement>(null);
  const errors = form.errors ?? [];
  const failed = form.status === "error";
  const fields = failed ? Object.entries(form.allErrors).filter(([name]) => name !== "") : [];
  const refusal = reply?.status === "error" && errors.length > 0 ? reply : null;

  useEffect(() => {
    if (refusal) place.current?.focus();
  }, [refusal]);

  // A long form is sent from its foot, and what is said stands at its head.
  useEffect(() => {
    if (reply?.done) place.current?.scrollIntoView({ block: "nearest" });
  }, [reply]);

  if (errors.length === 0 && fields.length < 2)
    return reply?.done ? (
      <div ref={place} className="scroll-mt-16">
        <Notice live>
          <p>{reply.done}</p>
        </Notice>
      </div>
    ) : null;

  const [title = `${plural(fields.length, "field")} need attention.`, ...missing] = errors;
  return (
    <div ref={place} tabIndex={-1}>
      <Notice kind="refusal" live title={title}>
        <ul className="list-disc pl-4 empty:hidden">
          {missing.map((sentence) => (
            <li key={sentence}>{sentence}</li>
          ))}
          {fields.map(([name, sentences]) => (
            <li key={name}>
              <a href={`#${form.id}-${name}`} onClick={(event) => leadTo(event, form.id, name)}>
                {sentences?.join(" ")}
              </a>
            </li>
          ))}
        </ul>
      </Notice>
    </div>
  );
}

/** The control of a group or a search box carries the field's id; all others its name. */
function leadTo(event: MouseEvent, formId: string, name: string) {
  event.preventDefault();
  const form = document.forms.namedItem(formId);
  const named = form?.elements.namedItem(name);
  const control = named instanceof RadioNodeList ? named[0] : named;
  const byId = document.getElementById(`${formId}-${name}`);
  const visible = control instanceof HTMLInputElement && control.type === "hidden" ? byId : (control ?? byId);
  if (visible instanceof HTMLElement) visible.focus();
}
