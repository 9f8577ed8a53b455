import { type ReactNode, useId } from "react";

type Props = { title: ReactNode; note?: ReactNode; actions?: ReactNode; id?: string; children: ReactNode };

/** A part of a page without a sheet of its own: a heading over what belongs together. */
export function Section({ title, note, actions, id, children }: Props) {
  const titleId = useId();
  return (
    <section id={id} aria-labelledby={titleId} className="mt-6 first:mt-0">
      <div className="mb-2 flex flex-wrap items-baseline justify-between gap-x-3 gap-y-1">
        <div className="flex flex-wrap items-baseline gap-x-2">
          <h2 id={titleId} className="text-large font-semibold">
            {title}
          </h2>
          {note ? <p className="text-small text-ink-2">{note}</p> : null}
        </div>
        {actions ? <div className="flex flex-wrap items-center gap-2 print:hidden">{actions}</div> : null}
      </div>
      {children}
    </section>
  );
}
