import { ButtonLink } from "./button-link";

type Props = {
  /** First and last row on this page, counted from one; total when it is known. */
  from: number;
  to: number;
  total?: number;
  previousHref?: string | null;
  nextHref?: string | null;
  previousLabel?: string;
  nextLabel?: string;
};

/** The way through a long list. A missing address leaves its button out of use. */
export function Pager(props: Props) {
  const { from, to, total, previousHref, nextHref, previousLabel = "Previous", nextLabel = "Next" } = props;
  return (
    <nav
      aria-label="Pages"
      className="flex flex-wrap items-center justify-between gap-2 px-4 py-2.5 print:hidden"
    >
      <p className="text-small text-ink-2">
        {to === 0 ? "None" : `${from} to ${to}`}
        {total === undefined ? "" : ` of ${total}`}
      </p>
      <div className="flex gap-2">
        <Step href={previousHref} label={previousLabel} />
        <Step href={nextHref} label={nextLabel} />
      </div>
    </nav>
  );
}

function Step({ href, label }: { href?: string | null; label: string }) {
  if (href)
    return (
      <ButtonLink href={href} size="small">
        {label}
      </ButtonLink>
    );
  return (
    <span className="inline-flex cursor-not-allowed items-center rounded-control border border-hair-2 px-2.5 py-1 text-small text-ink-2">
      {label}
    </span>
  );
}
