import "server-only";
import { eq } from "drizzle-orm";
import { recordNow } from "../../db/columns";
import { cycleDrafts } from "../../db/schema/cycles";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { conflict } from "../access/errors";
import { write } from "../write";
import { saveCycleDraftInput } from "./inputs";
import { lockOpenDraft } from "./lock-open-draft";
import { type DraftChange, mergeChanges } from "./sheet/merge-changes";

/**
 * Saves what was typed, field by field: a field that somebody else changed meanwhile is a conflict with both texts, and then
 * nothing of the request is saved. `fields` comes back whole when others had changed the draft since `version`.
 */
export function saveCycleDraft(context: Context, raw: unknown) {
  return write(
    context,
    "saveCycleDraft",
    saveCycleDraftInput,
    raw,
    async ({ transaction, input, record }) => {
      const draft = await lockOpenDraft(transaction, input.draftId);
      const { fields, changed, conflicts } = mergeChanges(draft.fields, input.changes);
      if (conflicts.length > 0)
        throw conflict(
          "Somebody else typed here meanwhile.",
          conflicts.map((each) => ({ ...each, label: each.field })),
        );
      const [saved] = await transaction
        .update(cycleDrafts)
        .set({
          fields,
          version: draft.version + 1,
          savedBy: requirePerson(context).personId,
          savedAt: recordNow,
        })
        .where(eq(cycleDrafts.id, draft.id))
        .returning({ version: cycleDrafts.version, savedAt: cycleDrafts.savedAt });
      await record({
        event: "draft saved",
        noun: "draft",
        objectId: draft.id,
        setId: draft.setId,
        before: textsOf(changed, "base"),
        after: textsOf(changed, "value"),
      });
      return {
        version: saved!.version,
        savedAt: saved!.savedAt.toISOString(),
        fields: draft.version === input.version ? null : fields,
      };
    },
  );
}

function textsOf(changes: DraftChange[], which: "base" | "value"): Record<string, string> {
  return Object.fromEntries(changes.map((change) => [change.field, change[which]]));
}
