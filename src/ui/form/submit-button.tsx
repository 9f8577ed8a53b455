"use client";
import type { MouseEvent, ReactNode } from "react";
import { type ButtonKind, type ButtonSize, buttonStyle } from "../button-style";
import { classNames } from "../class-names";
import { Spinner } from "../feedback/spinner";
import { useFormState } from "./form-context";

type Props = {
  children: ReactNode;
  /** What is being done while the server works: "Releasing". */
  busyLabel?: ReactNode;
  kind?: ButtonKind;
  size?: ButtonSize;
  /** With several submit buttons, which one it was. */
  name?: string;
  value?: string;
  disabled?: boolean;
  className?: string;
};

/** Sends the form around it. While the server works it says so and takes no second press, but keeps the focus. */
export function SubmitButton({
  children,
  busyLabel,
  kind = "primary",
  size,
  disabled,
  className,
  ...rest
}: Props) {
  const pending = useFormState()?.pending ?? false;

  function refuseSecond(event: MouseEvent) {
    if (pending) event.preventDefault();
  }

  return (
    <button
      type="submit"
      {...rest}
      disabled={disabled}
      aria-disabled={pending || undefined}
      onClick={refuseSecond}
      onMouseDown={keepFocus}
      className={classNames(buttonStyle(kind, size), className)}
    >
      {pending ? <Spinner /> : null}
      {pending ? (busyLabel ?? children) : children}
    </button>
  );
}

/** Leaving a field checks it, which may move the page under the pointer; so a press leaves the field where it is. */
function keepFocus(event: MouseEvent) {
  event.preventDefault();
}
