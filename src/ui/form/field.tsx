import type { ReactNode } from "react";
import { classNames } from "../class-names";
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
  children: ReactNode;
};

/** Label above, control, and below it one line for hint or error whose height is always there. */
export function Field({
  id,
  messageId,
  label,
  hint,
  errors,
  optional,
  labelHidden,
  className,
  children,
}: Props) {
  return (
    <div className={classNames("flex min-w-0 flex-col", className)}>
      <label htmlFor={id} className={labelHidden ? "sr-only" : "mb-1 text-small font-medium"}>
        {label}
        {optional ? <OptionalNote /> : null}
      </label>
      {children}
      <FieldMessage id={messageId} errors={errors} hint={hint} />
    </div>
  );
}

export function OptionalNote() {
  return <span className="ml-1.5 font-normal text-ink-2">optional</span>;
}
