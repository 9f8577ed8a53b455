"use client";
import { type FormField, useFormState } from "./form-context";

type Props = { name: string; field?: FormField; value?: string | number };

/** What goes along with the form: an id, the version it was based on. */
export function HiddenInput({ name, field, value }: Props) {
  const form = useFormState();
  const found = field ?? form?.fieldOf(name);
  if (value !== undefined) return <input type="hidden" name={found?.name ?? name} value={value} readOnly />;
  return (
    <input key={found?.key} type="hidden" name={found?.name ?? name} defaultValue={found?.defaultValue} />
  );
}
