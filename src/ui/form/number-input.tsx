"use client";
import type { ComponentProps } from "react";
import { classNames } from "../class-names";
import { controlStyle } from "./control-style";
import { Field } from "./field";
import { type FieldProps, useField } from "./use-field";

type Props = FieldProps &
  Omit<ComponentProps<"input">, keyof FieldProps | "id" | "type"> & {
    unit?: string;
    /** Whole numbers get the keyboard without a decimal mark. */
    whole?: boolean;
  };

/**
 * A number as it is typed, with point or comma. Never `type=number`: that drops what it cannot read, turns with the wheel, and
 * reads 1e3.
 */
export function NumberInput({ unit, whole = false, ...props }: Props) {
  const { frame, control, required, key, defaults, rest } = useField(props);
  const label = unit ? (
    <>
      {frame.label}
      <span className="sr-only"> in {unit}</span>
    </>
  ) : (
    frame.label
  );
  return (
    <Field {...frame} label={label}>
      <span className="relative flex">
        <input
          key={key}
          type="text"
          inputMode={whole ? "numeric" : "decimal"}
          autoComplete="off"
          defaultValue={"value" in rest ? undefined : defaults.value}
          aria-required={required}
          {...rest}
          {...control}
          style={unit ? { paddingRight: `${unit.length * 0.55 + 1.3}em` } : undefined}
          className={classNames(controlStyle, "text-right")}
        />
        {unit ? (
          <span
            aria-hidden="true"
            className="pointer-events-none absolute inset-y-0 right-2.5 flex items-center text-ink-2"
          >
            {unit}
          </span>
        ) : null}
      </span>
    </Field>
  );
}
