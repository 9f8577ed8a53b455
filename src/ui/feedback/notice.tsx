import { CircleAlert, CircleX, Info, TriangleAlert } from "lucide-react";
import type { ReactNode } from "react";
import { classNames } from "../class-names";

export type NoticeKind = "info" | "caution" | "refusal" | "error";

type Props = {
  kind?: NoticeKind;
  title?: ReactNode;
  children?: ReactNode;
  /** A step that helps, such as "Try again". */
  action?: ReactNode;
  /** Read out at once when it appears after something was done. */
  live?: boolean;
  className?: string;
};

const looks = {
  info: { icon: Info, stripe: "border-petrol", ground: "bg-petrol-soft/45", ink: "text-petrol", word: "" },
  caution: {
    icon: TriangleAlert,
    stripe: "border-held",
    ground: "bg-held-soft",
    ink: "text-held",
    word: "Caution: ",
  },
  refusal: { icon: CircleAlert, stripe: "border-out", ground: "bg-out-soft", ink: "text-out", word: "" },
  error: { icon: CircleX, stripe: "border-out", ground: "bg-out-soft", ink: "text-out", word: "Error: " },
};

/** A sentence in its place on the page. A refusal says what is missing; an error is ours. */
export function Notice({ kind = "info", title, children, action, live = false, className }: Props) {
  const { icon: Icon, stripe, ground, ink, word } = looks[kind];
  const urgent = kind === "refusal" || kind === "error";
  return (
    <div
      role={live ? (urgent ? "alert" : "status") : undefined}
      className={classNames(
        "flex gap-2.5 border-l-[3px] px-3 py-[9px] text-small",
        stripe,
        ground,
        className,
      )}
    >
      <Icon aria-hidden="true" size={16} className={classNames("mt-px shrink-0", ink)} />
      <div className="min-w-0 flex-1">
        <span className="sr-only">{word}</span>
        {title ? <p className="font-semibold">{title}</p> : null}
        {children}
        {action ? <div className="mt-2 flex flex-wrap gap-2">{action}</div> : null}
      </div>
    </div>
  );
}
