import type { ReactNode } from "react";

type Props = {
  title: ReactNode;
  subtitle?: ReactNode;
  /** Buttons; the most likely one last. */
  actions?: ReactNode;
  /** The way back up, above the title. */
  back?: ReactNode;
};

export function PageHeader({ title, subtitle, actions, back }: Props) {
  return (
    <header className="mb-3">
      {back ? <div className="mb-1 text-small text-ink-2 print:hidden">{back}</div> : null}
      <div className="flex flex-wrap items-center gap-x-3.5 gap-y-2">
        <div className="flex min-w-0 flex-1 basis-64 flex-wrap items-baseline gap-x-3.5 gap-y-0.5">
          <h1 className="text-title tracking-tight wrap-break-word">{title}</h1>
          {subtitle ? <p className="min-w-0 text-ink-2 wrap-break-word">{subtitle}</p> : null}
        </div>
        {actions ? <div className="flex flex-wrap items-center gap-2 print:hidden">{actions}</div> : null}
      </div>
    </header>
  );
}
