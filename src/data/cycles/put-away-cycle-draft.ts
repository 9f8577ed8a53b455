import "server-only";
import { eq } from "drizzle-orm";
import { recordNow } from "../../db/columns";
import { cycleDrafts } from "../../db/schema/cycles";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { write } from "../write";
import { putAwayCycleDraftInput } from "./inputs";
import { lockOpenDraft } from "./lock-open-draft";

/** Closes a draft that will not be recorded. What was typed stays with it. */
export function putAwayCycleDraft(context: Context, raw: unknown) {
  return write(
    context,
    "putAwayCycleDraft",
    putAwayCycleDraftInput,
    raw,
    async ({ transaction, input, record }) => {
      const draft = await lockOpenDraft(transaction, input.draftId);
      await transaction
        .update(cycleDrafts)
        .set({
          closedAt: recordNow,
          putAwayReason: input.reason,
          version: draft.version + 1,
          savedBy: requirePerson(context).personId,
          savedAt: recordNow,
        })
        .where(eq(cycleDrafts.id, draft.id));
      await record({
        event: "draft put away",
        noun: "draft",
        objectId: draft.id,
        setId: draft.setId,
        reason: input.reason,
      });
      return { setId: draft.setId };
    },
  );
}
