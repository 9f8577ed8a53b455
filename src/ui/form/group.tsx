import type { ReactNode } from "react";
import { classNames } from "../class-names";
import { OptionalNote } from "./field";
import { FieldMessage } from "./field-message";

type Props = {
  id: string;
  messageId: string;
  label: ReactNode;
  hint?: ReactNode;
  errors?: string[];
  optional?: boolean;
  labelHidden?: boolean;
  className?: string;
  role?: "radiogroup" | "group";
  children: ReactNode;
};

/** Several controls under one question. */
export function Group({
  id,
  messageId,
  label,
  hint,
  errors,
  optional,
  labelHidden,
  className,
  role,
  children,
}: Props) {
  return (
    <fieldset
      id={id}
      role={role}
      tabIndex={-1}
      aria-describedby={errors || hint ? messageId : undefined}
      aria-invalid={role === "radiogroup" && errors ? true : undefined}
      className={classNames("min-w-0", className)}
    >
      <legend className={labelHidden ? "sr-only" : "mb-1 text-small font-medium"}>
        {label}
        {optional ? <OptionalNote /> : null}
      </legend>
      {children}
      <FieldMessage id={messageId} errors={errors} hint={hint} />
    </fieldset>
  );
}
