"use client";
import type { ComponentProps } from "react";
import { classNames } from "../class-names";
import { controlStyle } from "./control-style";
import { Field } from "./field";
import { type FieldProps, useField } from "./use-field";

type Props = FieldProps & Omit<ComponentProps<"textarea">, keyof FieldProps | "id">;

/** Grows with what is typed where the browser can. */
export function TextArea(props: Props) {
  const { frame, control, required, key, defaults, rest } = useField(props);
  return (
    <Field {...frame}>
      <textarea
        key={key}
        rows={3}
        defaultValue={"value" in rest ? undefined : defaults.value}
        aria-required={required}
        {...rest}
        {...control}
        className={classNames(controlStyle, "max-h-96 resize-y field-sizing-content min-h-20")}
      />
    </Field>
  );
}
