import "server-only";
import { eq } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { recordNow } from "../../db/columns";
import { setHolds } from "../../db/schema/sets";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";

export async function clearHold(
  transaction: Transaction,
  context: Context,
  holdId: string,
  reason: string,
): Promise<void> {
  await transaction
    .update(setHolds)
    .set({ clearedBy: requirePerson(context).personId, clearedAt: recordNow, clearedReason: reason })
    .where(eq(setHolds.id, holdId));
}
