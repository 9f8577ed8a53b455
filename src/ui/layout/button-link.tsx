import Link from "next/link";
import type { ComponentProps } from "react";
import { type ButtonKind, type ButtonSize, buttonStyle } from "../button-style";
import { classNames } from "../class-names";

type Props = ComponentProps<typeof Link> & { kind?: ButtonKind; size?: ButtonSize };

/** A link that looks like a button, since what it does is go somewhere. */
export function ButtonLink({ kind, size, className, ...props }: Props) {
  return <Link {...props} className={classNames(buttonStyle(kind, size), className)} />;
}
