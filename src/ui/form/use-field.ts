"use client";
import { type ReactNode, useId } from "react";
import { type FormField, useFormState } from "./form-context";

export type FieldProps = {
  label: ReactNode;
  /** Name of a field of the form around it; for a field of a list give `field`. */
  name?: string;
  field?: FormField;
  hint?: ReactNode;
  /** Errors of a control that stands outside a form. */
  errors?: string[];
  optional?: boolean;
  labelHidden?: boolean;
  className?: string;
};

/** Finds the field of an input, by itself or by its name in the form around it, and wires label, hint and error. */
export function useField<Props extends FieldProps>(props: Props) {
  const { label, name, field, hint, errors, optional, labelHidden, className, ...rest } = props;
  const form = useFormState();
  const madeId = useId();
  const found = field ?? (name ? form?.fieldOf(name) : undefined);
  const id = found?.id ?? madeId;
  const messageId = `${id}-message`;
  const said = errors ?? found?.errors;
  const messages = said?.length ? said : undefined;
  return {
    frame: { id, messageId, label, hint, errors: messages, optional, labelHidden, className },
    control: {
      id,
      name: found?.name ?? name,
      "aria-invalid": messages ? (true as const) : undefined,
      "aria-describedby": messages || hint ? messageId : undefined,
    },
    required: optional ? undefined : (true as const),
    key: found?.key,
    defaults: {
      value: found?.defaultValue,
      options: found?.defaultOptions ?? [],
      checked: found?.defaultChecked,
    },
    rest,
  };
}
