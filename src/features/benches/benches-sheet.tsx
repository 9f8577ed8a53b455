import Link from "next/link";
import type { BenchRow } from "@/data/benches";
import { formatRecordDayOf } from "@/format/format-date";
import { Sheet } from "@/ui/layout/sheet";
import { BenchStateMark } from "./bench-state";

/** Which benches can be worked on. */
export function BenchesSheet({ benches, zone }: { benches: BenchRow[]; zone: string }) {
  return (
    <Sheet title="Benches" padding="none">
      {benches.length === 0 ? (
        <p className="px-4 pb-4 text-ink-2">None is set up yet.</p>
      ) : (
        <ul className="divide-y divide-hair-2 border-t border-hair-2">
          {benches.map(({ benchId, code, location, state, calibratedUntil }) => (
            <li key={benchId}>
              <Link
                href={`/calibration/${benchId}`}
                className="flex flex-wrap items-baseline justify-between gap-x-4 px-4 py-2 no-underline hover:bg-raised"
              >
                <span>
                  <span className="font-semibold">{code}</span> <span className="text-ink-2">{location}</span>
                </span>
                <BenchStateMark
                  state={state}
                  until={calibratedUntil && formatRecordDayOf(calibratedUntil, zone)}
                />
              </Link>
            </li>
          ))}
        </ul>
      )}
    </Sheet>
  );
}
