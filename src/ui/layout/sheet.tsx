import { type ReactNode, useId } from "react";
import { classNames } from "../class-names";

type Props = {
  title?: ReactNode;
  /** Small words after the title: what is shown and how. */
  note?: ReactNode;
  actions?: ReactNode;
  /** Tables and grids come to the edge. */
  padding?: "normal" | "none";
  level?: 2 | 3;
  className?: string;
  id?: string;
  children: ReactNode;
};

/** A sheet of paper on the ground: one subject. */
export function Sheet({
  title,
  note,
  actions,
  padding = "normal",
  level = 2,
  className,
  id,
  children,
}: Props) {
  const titleId = useId();
  const Heading = level === 2 ? "h2" : "h3";
  return (
    <section
      id={id}
      aria-labelledby={title ? titleId : undefined}
      className={classNames("min-w-0 rounded-sheet border border-hair bg-sheet", className)}
    >
      {title || actions ? (
        <div
          className={classNames(
            "flex flex-wrap items-center justify-between gap-x-3 gap-y-1 px-4 pt-3.5",
            padding === "none" ? "pb-2.5" : "pb-2",
          )}
        >
          <div className="flex flex-wrap items-baseline gap-x-2">
            {title ? (
              <Heading id={titleId} className="text-heading">
                {title}
              </Heading>
            ) : null}
            {note ? <p className="text-key text-ink-2">{note}</p> : null}
          </div>
          {actions ? <div className="flex flex-wrap items-center gap-2 print:hidden">{actions}</div> : null}
        </div>
      ) : null}
      <div className={classNames(padding === "normal" && (title ? "px-4 pb-3.5" : "px-4 py-3.5"))}>
        {children}
      </div>
    </section>
  );
}
