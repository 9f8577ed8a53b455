"use client";
import type { ReactNode } from "react";
import type { ButtonKind, ButtonSize } from "../button-style";
import { Form } from "./form";
import { HiddenInput } from "./hidden-input";
import type { FormAction } from "./reply";
import { SubmitButton } from "./submit-button";
import { useServerForm } from "./use-server-form";

type Props = {
  action: FormAction;
  /** What goes along: ids, versions. */
  fields?: Record<string, string | number>;
  children: ReactNode;
  busyLabel?: ReactNode;
  kind?: ButtonKind;
  size?: ButtonSize;
};

/** A form of one button. A refusal is said above it. */
export function ActionButton({ action, fields = {}, children, busyLabel, kind = "plain", size }: Props) {
  const form = useServerForm({ action });
  return (
    <Form form={form} className="inline-flex flex-col items-start gap-2">
      {Object.entries(fields).map(([name, value]) => (
        <HiddenInput key={name} name={name} value={value} />
      ))}
      <SubmitButton kind={kind} size={size} busyLabel={busyLabel}>
        {children}
      </SubmitButton>
    </Form>
  );
}
