"use client";
import { useState } from "react";
import type { CycleDraft } from "../../data/cycles";
import { isAcknowledged } from "../../data/cycles/sheet/acknowledge";
import { describeMissing } from "../../data/cycles/sheet/describe-missing";
import { missingCalibrations } from "../../data/cycles/sheet/missing-calibrations";
import type { SheetProblems } from "../../data/cycles/sheet/types";
import { plural } from "../../format/plural";
import { Notice } from "../../ui/feedback/notice";
import { ConfirmDialog } from "../../ui/form/confirm-dialog";
import { ReasonDialog } from "../../ui/form/reason-dialog";
import type { FormReply } from "../../ui/form/reply";
import { Sheet } from "../../ui/layout/sheet";
import { putAwayCycleDraftAction, recordCycleAction, recordCycleCorrectionAction } from "./actions";
import type { DraftStore } from "./draft/draft-store";
import type { Evaluation } from "./use-evaluation";

type Props = { draft: CycleDraft; store: DraftStore; evaluation: Evaluation; problems: SheetProblems };

/** What is still missing, and the step that freezes the sheet. */
export function RecordPanel({ draft, store, evaluation, problems }: Props) {
  const { sheet, bench, findings } = evaluation;
  const { fields } = store.snapshot();
  const open = findings.filter((finding) => !isAcknowledged(finding, sheet, fields));
  const lapsed = bench ? missingCalibrations(bench, sheet) : [];
  const [all, showAll] = useState(false);
  const missing = [
    ...(draft.set.holdReason === null ? [] : [`The set is on hold: ${draft.set.holdReason}`]),
    ...Object.values(problems).flat(),
    ...lapsed.map((each) => describeMissing(each, draft.zone)),
    ...(open.length > 0
      ? [`${plural(open.length, "doubtful reading")} to read again or to record as read.`]
      : []),
  ];
  const shown = all ? missing : missing.slice(0, 6);

  return (
    <Sheet title={draft.corrects ? "Record the correction" : "Record the cycle"}>
      {missing.length > 0 ? (
        <Notice title="Before it can be recorded">
          <ul className="list-disc pl-4">
            {shown.map((sentence) => (
              <li key={sentence}>{sentence}</li>
            ))}
          </ul>
          {missing.length > shown.length ? (
            <button type="button" className="mt-1 underline" onClick={() => showAll(true)}>
              {missing.length - shown.length} more
            </button>
          ) : null}
        </Notice>
      ) : (
        <p className="text-ink-2">
          Once it is recorded it is frozen: a correction is a new revision with a reason.
        </p>
      )}
      <div className="mt-3 flex flex-wrap justify-end gap-2">
        <ReasonDialog
          trigger="Put away"
          triggerKind="quiet"
          title={`Put the sheet of set ${draft.set.number} away`}
          description="It will not be recorded. What was typed stays on the record with the reason."
          action={putAwayCycleDraftAction}
          fields={{ draftId: draft.draftId }}
          submitLabel="Put away"
          submitKind="danger"
        />
        <RecordDialog draft={draft} store={store} />
      </div>
    </Sheet>
  );
}

/** Everything typed reaches the server first; then that very version is recorded. */
function RecordDialog({ draft, store }: Pick<Props, "draft" | "store">) {
  const number = draft.set.number;
  const shared = {
    triggerKind: "primary" as const,
    triggerSize: "large" as const,
    submitKind: "primary" as const,
    fields: { draftId: draft.draftId },
    busyLabel: "Recording",
  };

  function afterSaving(action: typeof recordCycleAction) {
    return async (previous: FormReply | undefined, data: FormData): Promise<FormReply> => {
      const saved = await store.flush();
      if (!saved) return notSaved();
      data.set("version", String(store.snapshot().state.version));
      return action(previous, data);
    };
  }

  if (draft.corrects)
    return (
      <ReasonDialog
        {...shared}
        trigger="Record correction"
        title={`Record a correction ${draft.phase} of set ${number}`}
        description="It becomes a new revision; the one before stays readable."
        submitLabel="Record correction"
        action={afterSaving(recordCycleCorrectionAction)}
      />
    );
  return (
    <ConfirmDialog
      {...shared}
      trigger="Record cycle"
      title={`Record set ${number} ${draft.phase}`}
      description="The readings are frozen as they stand. A correction afterwards is a new revision with a reason."
      submitLabel="Record cycle"
      action={afterSaving(recordCycleAction)}
    />
  );
}

function notSaved(): FormReply {
  const message =
    "Not everything typed has reached the server yet, or a conflict is open. Nothing was recorded.";
  return { status: "error", error: { "": [message] } };
}
