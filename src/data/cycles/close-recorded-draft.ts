import "server-only";
import { eq } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { recordNow } from "../../db/columns";
import { cycleDrafts } from "../../db/schema/cycles";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import type { OpenDraft } from "./lock-open-draft";

export async function closeRecordedDraft(
  transaction: Transaction,
  context: Context,
  draft: OpenDraft,
  recordedRevisionId: string,
): Promise<void> {
  const { personId: savedBy } = requirePerson(context);
  await transaction
    .update(cycleDrafts)
    .set({ closedAt: recordNow, recordedRevisionId, version: draft.version + 1, savedBy, savedAt: recordNow })
    .where(eq(cycleDrafts.id, draft.id));
}
