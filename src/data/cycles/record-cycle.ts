import "server-only";
import { and, eq, max } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { cycles } from "../../db/schema/cycles";
import type { Phase } from "../../db/vocabulary";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { refused } from "../access/errors";
import { moveStage, requireOpenSet } from "../course";
import { write } from "../write";
import { closeRecordedDraft } from "./close-recorded-draft";
import { recordCycleInput } from "./inputs";
import { insertRevision } from "./insert-revision";
import { lockOpenDraft, requireSameDraft } from "./lock-open-draft";
import { requireRecordable } from "./require-recordable";
import { requireTurn } from "./require-turn";

/** Freezes what was typed: from here on it is corrected by a new revision with a reason, never overwritten. */
export function recordCycle(context: Context, raw: unknown) {
  return write(context, "recordCycle", recordCycleInput, raw, async ({ transaction, input, record }) => {
    const draft = await lockOpenDraft(transaction, input.draftId);
    if (draft.correctsCycleId)
      throw refused("This sheet corrects a cycle and is recorded as its correction.");
    requireSameDraft(draft, input.version);
    const set = await requireOpenSet(transaction, draft.setId);
    requireTurn(set.stage, draft.phase);
    const { sheet, bench, findings } = await requireRecordable(transaction, draft);
    const number = await nextNumber(transaction, draft.setId, draft.phase);
    const [cycle] = await transaction
      .insert(cycles)
      .values({ setId: draft.setId, phase: draft.phase, number })
      .returning({ id: cycles.id });
    const revisionId = await insertRevision(transaction, {
      cycleId: cycle!.id,
      revision: 1,
      reason: null,
      sheet,
      bench,
      acknowledged: findings,
      personId: requirePerson(context).personId,
    });
    await closeRecordedDraft(transaction, context, draft, revisionId);
    if (set.stage !== draft.phase) await moveStage(transaction, context, set, draft.phase);
    await record({
      event: "cycle recorded",
      noun: "cycle",
      objectId: cycle!.id,
      setId: draft.setId,
      after: { phase: draft.phase, number, revisionId, bench: bench.code, findings: findings.length },
    });
    return { cycleId: cycle!.id, revisionId, setId: draft.setId };
  });
}

async function nextNumber(transaction: Transaction, setId: string, phase: Phase): Promise<number> {
  const [last] = await transaction
    .select({ number: max(cycles.number) })
    .from(cycles)
    .where(and(eq(cycles.setId, setId), eq(cycles.phase, phase)));
  return (last?.number ?? 0) + 1;
}
