"use client";
import type { ComponentProps } from "react";
import { choiceStyle, tickStyle } from "./choice-style";
import { FieldMessage } from "./field-message";
import { type FieldProps, useField } from "./use-field";

type Props = Omit<FieldProps, "optional"> &
  Omit<ComponentProps<"input">, keyof FieldProps | "id" | "type" | "value">;

/** One yes or no. */
export function Checkbox(props: Props) {
  const { frame, control, key, defaults, rest } = useField(props);
  return (
    <div className={frame.className}>
      <label className={choiceStyle}>
        <input
          key={key}
          type="checkbox"
          defaultChecked={"checked" in rest ? undefined : defaults.checked}
          {...rest}
          {...control}
          className={tickStyle}
        />
        <span className={frame.labelHidden ? "sr-only" : undefined}>{frame.label}</span>
      </label>
      <FieldMessage id={frame.messageId} errors={frame.errors} hint={frame.hint} />
    </div>
  );
}
