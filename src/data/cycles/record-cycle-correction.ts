import "server-only";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { refused } from "../access/errors";
import { write } from "../write";
import { closeRecordedDraft } from "./close-recorded-draft";
import { recordCycleCorrectionInput } from "./inputs";
import { insertRevision } from "./insert-revision";
import { lockOpenDraft, requireSameDraft } from "./lock-open-draft";
import { requireOwnCycle } from "./open-cycle-correction";
import { requireRecordable } from "./require-recordable";

/** A new revision beside the old ones, on the calibrations that were in force when the cycle was measured. */
export function recordCycleCorrection(context: Context, raw: unknown) {
  return write(
    context,
    "recordCycleCorrection",
    recordCycleCorrectionInput,
    raw,
    async ({ transaction, input, record }) => {
      const draft = await lockOpenDraft(transaction, input.draftId);
      const cycleId = draft.correctsCycleId;
      if (!cycleId) throw refused("This sheet is a new cycle, not a correction.");
      requireSameDraft(draft, input.version);
      const { latest } = await requireOwnCycle(transaction, context, cycleId);
      const { sheet, bench, findings } = await requireRecordable(transaction, draft, latest.cycle.measuredAt);
      const revision = latest.revision + 1;
      const revisionId = await insertRevision(transaction, {
        cycleId,
        revision,
        reason: input.reason,
        sheet,
        bench,
        acknowledged: findings,
        personId: requirePerson(context).personId,
      });
      await closeRecordedDraft(transaction, context, draft, revisionId);
      await record({
        event: "cycle corrected",
        noun: "cycle",
        objectId: cycleId,
        setId: draft.setId,
        before: { revisionId: latest.cycleRevisionId, revision: latest.revision },
        after: { revisionId, revision, findings: findings.length },
        reason: input.reason,
      });
      return { cycleId, revisionId, setId: draft.setId };
    },
  );
}
