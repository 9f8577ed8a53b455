import Link from "next/link";
import type { listBenchQueue } from "@/data/cycles";
import type { Phase, Stage } from "@/db/vocabulary";
import type { Clock } from "@/format/calendar";
import { daysFromToday, formatInstant, formatPromise } from "@/format/format-date";
import { joinWords } from "@/format/join-words";
import { plural } from "@/format/plural";
import { StatusMark } from "@/ui/feedback/status-mark";
import { ButtonLink } from "@/ui/layout/button-link";
import { EmptyState } from "@/ui/layout/empty-state";
import { Sheet } from "@/ui/layout/sheet";
import { OpenSheetButton } from "../open-sheet-button";

type Queue = Awaited<ReturnType<typeof listBenchQueue>>;
type QueuedSet = Queue["sets"][number];

/** Sets that wait for the bench, each with its next step under the hand. */
export function BenchQueue({ sets, clock }: { sets: QueuedSet[]; clock: Clock }) {
  return (
    <Sheet title="Next" note={plural(sets.length, "set")} padding="none">
      {sets.length === 0 ? (
        <EmptyState title="Nothing waits for the bench">
          Sets appear as the counter checks them in.
        </EmptyState>
      ) : (
        <ol className="divide-y divide-hair-2 border-t border-hair-2">
          {sets.map((set) => (
            <li
              key={set.setId}
              className="grid gap-x-5 gap-y-1.5 px-4 py-3 laptop:grid-cols-[6rem_minmax(0,1.6fr)_minmax(0,1.2fr)_11rem_11rem] laptop:items-center"
            >
              <Link href={`/sets/${set.setId}`} className="font-semibold no-underline hover:underline">
                {set.number}
              </Link>
              <p className="min-w-0">
                {plural(set.injectorCount, "injector")}, {set.modelName}
                <span className="block text-small text-ink-2">
                  {set.customerName}; {joinWords(set.workAsked)}
                </span>
              </p>
              <p className="min-w-0">
                <Standing set={set} />
                <OpenSheets set={set} clock={clock} />
              </p>
              <PromisedBy day={set.promisedOn} clock={clock} />
              <div className="laptop:justify-self-end">
                <NextStep set={set} />
              </div>
            </li>
          ))}
        </ol>
      )}
    </Sheet>
  );
}

function Standing({ set: { stage, holdReason } }: { set: QueuedSet }) {
  return holdReason === null ? stage : <StatusMark kind="held">on hold: {holdReason}</StatusMark>;
}

function OpenSheets({ set, clock }: { set: QueuedSet; clock: Clock }) {
  return set.drafts.map(({ draftId, phase, corrects, savedBy, savedAt }) => (
    <Link key={draftId} href={`/bench/${draftId}`} className="block text-small">
      {corrects ? "correction of" : "open sheet"} {phase}, {savedBy} {formatInstant(savedAt, clock)}
    </Link>
  ));
}

function PromisedBy({ day, clock }: { day: string; clock: Clock }) {
  const words = formatPromise(day, clock);
  return (
    <p>
      {daysFromToday(day, clock) < 0 ? <StatusMark kind="late">{words}</StatusMark> : `promised ${words}`}
    </p>
  );
}

const nextPhase: Partial<Record<Stage, Phase>> = { "checked in": "as found", cleaning: "as left" };

function NextStep({ set: { setId, stage, holdReason } }: { set: QueuedSet }) {
  if (holdReason !== null) return null;
  const phase = nextPhase[stage];
  if (phase)
    return (
      <OpenSheetButton setId={setId} phase={phase} kind="primary">
        {`Measure ${phase}`}
      </OpenSheetButton>
    );
  if (stage === "as found")
    return (
      <ButtonLink href={`/sets/${setId}/cleaning`} kind="primary">
        Clean
      </ButtonLink>
    );
  return <ButtonLink href={`/sets/${setId}`}>Look at it</ButtonLink>;
}
