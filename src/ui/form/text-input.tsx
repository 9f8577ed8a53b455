"use client";
import type { ComponentProps } from "react";
import { controlStyle } from "./control-style";
import { Field } from "./field";
import { type FieldProps, useField } from "./use-field";

export type TextInputProps = FieldProps & Omit<ComponentProps<"input">, keyof FieldProps | "id">;

export function TextInput(props: TextInputProps) {
  const { frame, control, required, key, defaults, rest } = useField(props);
  return (
    <Field {...frame}>
      <input
        key={key}
        type="text"
        defaultValue={"value" in rest ? undefined : defaults.value}
        aria-required={required}
        {...rest}
        {...control}
        className={controlStyle}
      />
    </Field>
  );
}
