import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { setHolds, sets } from "../../db/schema/sets";
import { notFound } from "../access/errors";

export type LockedSet = Awaited<ReturnType<typeof lockSet>>;

/** The set's row, locked until the transaction ends: whatever is decided by its stage or hold stays true till then. */
export async function lockSet(transaction: Transaction, setId: string) {
  const [set] = await transaction
    .select({
      setId: sets.id,
      number: sets.number,
      customerId: sets.customerId,
      modelId: sets.injectorModelId,
      toleranceClassId: sets.toleranceClassId,
      workAsked: sets.workAsked,
      customerRequest: sets.customerRequest,
      internalNote: sets.internalNote,
      promisedOn: sets.promisedOn,
      stage: sets.stage,
      version: sets.version,
    })
    .from(sets)
    .where(eq(sets.id, setId))
    .for("update");
  if (!set) throw notFound("set");
  const [hold] = await transaction
    .select({ holdId: setHolds.id, reason: setHolds.reason })
    .from(setHolds)
    .where(and(eq(setHolds.setId, setId), isNull(setHolds.clearedAt)));
  return { ...set, hold: hold ?? null };
}
