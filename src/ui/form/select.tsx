"use client";
import type { ComponentProps } from "react";
import { classNames } from "../class-names";
import { controlStyle } from "./control-style";
import { Field } from "./field";
import { asOptions, type Options } from "./options";
import { type FieldProps, useField } from "./use-field";

type Props = FieldProps &
  Omit<ComponentProps<"select">, keyof FieldProps | "id" | "children"> & {
    options: Options;
    /** The first entry, which chooses nothing. */
    placeholder?: string;
  };

export function Select({ options, placeholder, ...props }: Props) {
  const { frame, control, required, key, defaults, rest } = useField(props);
  return (
    <Field {...frame}>
      <select
        key={key}
        defaultValue={"value" in rest ? undefined : (defaults.value ?? "")}
        aria-required={required}
        {...rest}
        {...control}
        className={classNames(controlStyle, "h-[34px] pointer-coarse:h-auto")}
      >
        {placeholder === undefined ? null : <option value="">{placeholder}</option>}
        {asOptions(options).map(({ value, label, disabled }) => (
          <option key={value} value={value} disabled={disabled}>
            {label}
          </option>
        ))}
      </select>
    </Field>
  );
}
