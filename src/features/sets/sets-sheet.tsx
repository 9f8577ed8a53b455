import Link from "next/link";
import type { SetRow } from "@/data/sets";
import type { Clock } from "@/format/calendar";
import { formatPromise } from "@/format/format-date";
import { StatusMark } from "@/ui/feedback/status-mark";
import { Sheet } from "@/ui/layout/sheet";

type Props = {
  title: string;
  /** What is said when there is none. */
  none: string;
  sets: { rows: SetRow[]; total: number };
  /** Where all of them are listed. */
  href: string;
  clock: Clock;
};

/** The first few sets of one kind, and the way to the rest. */
export function SetsSheet({ title, none, sets: { rows, total }, href, clock }: Props) {
  return (
    <Sheet title={title} note={total > 0 ? String(total) : undefined} padding="none">
      {rows.length === 0 ? (
        <p className="px-4 pb-4 text-ink-2">{none}</p>
      ) : (
        <ul className="divide-y divide-hair-2 border-t border-hair-2">
          {rows.map((row) => (
            <li key={row.setId}>
              <Link
                href={`/sets/${row.setId}`}
                className="flex flex-wrap items-baseline justify-between gap-x-4 px-4 py-2 no-underline hover:bg-raised"
              >
                <span className="min-w-0">
                  <span className="font-semibold">{row.number}</span> {row.customer}
                  <span className="block text-small text-ink-2">{row.model}</span>
                </span>
                <Standing row={row} clock={clock} />
              </Link>
            </li>
          ))}
        </ul>
      )}
      {total > rows.length ? (
        <p className="px-4 py-2.5 text-small">
          <Link href={href}>All {total}</Link>
        </p>
      ) : null}
    </Sheet>
  );
}

function Standing({ row: { hold, stage, daysLate, promisedOn }, clock }: { row: SetRow; clock: Clock }) {
  if (hold) return <StatusMark kind="held">on hold</StatusMark>;
  if (daysLate > 0) return <StatusMark kind="late">{formatPromise(promisedOn, clock)}</StatusMark>;
  return <span className="text-small text-ink-2">{stage}</span>;
}
