import type { ReactNode } from "react";
import { classNames } from "../class-names";
import type { StatusKind } from "./status-mark-kind";
import { StatusShape } from "./status-shape";

const inks: Record<StatusKind, string> = {
  pass: "text-petrol",
  "conditional pass": "text-petrol",
  "conditional fail": "text-out",
  fail: "text-out",
  held: "text-held",
  late: "text-out",
  due: "text-held",
  neutral: "text-ink-2",
};

type Props = {
  kind: StatusKind;
  /** The word beside the shape; the kind's own when left out. */
  children?: ReactNode;
};

/** A state told by shape, word and colour at once, so that any one of them is enough. */
export function StatusMark({ kind, children }: Props) {
  return (
    <span className={classNames("inline-flex items-baseline gap-1.5 font-medium", inks[kind])}>
      <StatusShape kind={kind} />
      <span>{children ?? (kind === "neutral" ? "no verdict" : kind)}</span>
    </span>
  );
}
