import type { ComponentProps } from "react";
import { type ButtonKind, type ButtonSize, buttonStyle } from "../button-style";
import { classNames } from "../class-names";

type Props = ComponentProps<"button"> & { kind?: ButtonKind; size?: ButtonSize };

/** A button that does something on this page. */
export function Button({ kind, size, className, type = "button", ...props }: Props) {
  return <button {...props} type={type} className={classNames(buttonStyle(kind, size), className)} />;
}
