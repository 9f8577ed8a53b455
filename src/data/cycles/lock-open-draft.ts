import "server-only";
import { eq } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { cycleDrafts } from "../../db/schema/cycles";
import { people } from "../../db/schema/people";
import { conflict, notFound, refused } from "../access/errors";

export type OpenDraft = typeof cycleDrafts.$inferSelect;

/** The draft, locked, or why it takes nothing more. */
export async function lockOpenDraft(transaction: Transaction, draftId: string): Promise<OpenDraft> {
  const [draft] = await transaction
    .select()
    .from(cycleDrafts)
    .where(eq(cycleDrafts.id, draftId))
    .for("update");
  if (!draft) throw notFound("draft");
  if (!draft.closedAt) return draft;
  const [person] = await transaction
    .select({ name: people.name })
    .from(people)
    .where(eq(people.id, draft.savedBy));
  const what = draft.recordedRevisionId ? "recorded" : "put away";
  throw refused(`This sheet was ${what} by ${person?.name ?? "somebody else"} meanwhile.`);
}

/** What is recorded is what the page showed. */
export function requireSameDraft(draft: OpenDraft, version: number): void {
  if (draft.version !== version)
    throw conflict("The sheet was changed since. Please look at it again before you record it.", []);
}
