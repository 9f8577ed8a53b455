import type { ReactNode } from "react";
import type { SetResults } from "@/data/cycles/results";
import type { SetDetail } from "@/data/sets";
import type { Stage } from "@/db/vocabulary";
import { CorrectCycleButton, OpenSheetButton } from "@/features/cycles/open-sheet-button";
import { SendToReviewButton } from "@/features/cycles/send-to-review-button";
import { RejectInjectorDialog, ReplaceInjectorDialog } from "@/features/sets/reject-injector-dialogs";
import { Notice } from "@/ui/feedback/notice";
import { ButtonLink } from "@/ui/layout/button-link";
import { Sheet } from "@/ui/layout/sheet";

type Props = { set: SetDetail; results: SetResults; personId: string; roles: readonly string[] };

const notes: Partial<Record<Stage, string>> = {
  "checked in": "measured as found before anything is cleaned",
  "as found": "to be cleaned",
  cleaning: "to be measured as left",
  "as left": "ready for review, or cleaned and measured once more",
};

/** What the technician does next with a set, and what may still be put right. */
export function BenchStep({ set, results, personId, roles }: Props) {
  const note = notes[set.stage];
  if (!roles.includes("technician") || (!note && set.stage !== "in review")) return null;
  const own = [results.asFound, results.asLeft].filter(
    (phase) => phase?.latest.recordedBy.personId === personId,
  );
  return (
    <Sheet title="At the bench" note={note}>
      {set.hold ? (
        <Notice kind="caution" title="The set is on hold.">
          {set.hold.reason}
        </Notice>
      ) : (
        <div className="flex flex-wrap items-start gap-2">
          {stepsAt(set)}
          {own.map((phase) =>
            phase ? (
              <CorrectCycleButton key={phase.cycleId} cycleId={phase.cycleId}>
                {`Correct the cycle ${phase.phase}`}
              </CorrectCycleButton>
            ) : null,
          )}
        </div>
      )}
      {note && !set.hold ? <Injectors set={set} /> : null}
    </Sheet>
  );
}

function stepsAt({ setId, number, stage }: SetDetail): ReactNode {
  const clean = (label: string, kind: "primary" | "plain") => (
    <ButtonLink href={`/sets/${setId}/cleaning`} kind={kind}>
      {label}
    </ButtonLink>
  );
  switch (stage) {
    case "checked in":
      return (
        <OpenSheetButton setId={setId} phase="as found" kind="primary">
          Measure as found
        </OpenSheetButton>
      );
    case "as found":
      return (
        <>
          {clean("Record a cleaning run", "primary")}
          <OpenSheetButton setId={setId} phase="as found">
            Measure as found again
          </OpenSheetButton>
        </>
      );
    case "cleaning":
      return (
        <>
          <OpenSheetButton setId={setId} phase="as left" kind="primary">
            Measure as left
          </OpenSheetButton>
          {clean("Another cleaning run", "plain")}
        </>
      );
    case "as left":
      return (
        <>
          <SendToReviewButton setId={setId} number={number} />
          <OpenSheetButton setId={setId} phase="as left">
            Measure as left again
          </OpenSheetButton>
          {clean("Clean again", "plain")}
        </>
      );
    default:
      return null;
  }
}

function Injectors({ set }: { set: SetDetail }) {
  return (
    <details className="mt-3">
      <summary className="text-small font-medium text-ink-2">Reject or replace an injector</summary>
      <ul className="mt-1 divide-y divide-hair-2">
        {set.injectors
          .filter(({ state }) => state !== "replaced")
          .map((injector) => (
            <li key={injector.setInjectorId} className="flex items-center justify-between gap-3 py-1">
              <span>
                {injector.tag} <span className="text-ink-2">{injector.serial ?? injector.marking}</span>
              </span>
              {injector.state === "rejected" ? (
                <ReplaceInjectorDialog injector={injector} />
              ) : (
                <RejectInjectorDialog injector={injector} />
              )}
            </li>
          ))}
      </ul>
    </details>
  );
}
