import "server-only";
import { createHash } from "node:crypto";
import { and, eq } from "drizzle-orm";
import type { Transaction } from "../db/client";
import { idempotencyKeys } from "../db/schema/idempotency";
import { actorLabel, type Context } from "./access/actor";
import { refused } from "./access/errors";

function keyOf(input: unknown): string | undefined {
  return (input as { idempotencyKey?: string } | undefined)?.idempotencyKey;
}

function hashOf(input: unknown): string {
  return createHash("sha256").update(JSON.stringify(input)).digest("hex");
}

/**
 * Takes the key of this write. When it was taken before, the first answer is given again; while the first is still
 * running, the unique key makes this one wait for it.
 */
export async function answeredBefore<Result>(
  transaction: Transaction,
  context: Context,
  verb: string,
  input: unknown,
): Promise<{ result: Result } | null> {
  const key = keyOf(input);
  if (!key) return null;
  const inputHash = hashOf(input);
  const actor = actorLabel(context.actor);
  const taken = await transaction
    .insert(idempotencyKeys)
    .values({ actor, verb, key, inputHash })
    .onConflictDoNothing()
    .returning({ key: idempotencyKeys.key });
  if (taken.length > 0) return null;
  const [first] = await transaction
    .select()
    .from(idempotencyKeys)
    .where(
      and(eq(idempotencyKeys.actor, actor), eq(idempotencyKeys.verb, verb), eq(idempotencyKeys.key, key)),
    );
  if (first?.inputHash !== inputHash)
    throw refused("This form was already sent with other values. Reload the page to send it again.");
  return { result: first.result as Result };
}

export async function keepAnswer(
  transaction: Transaction,
  context: Context,
  verb: string,
  input: unknown,
  result: unknown,
): Promise<void> {
  const key = keyOf(input);
  if (!key) return;
  await transaction
    .update(idempotencyKeys)
    .set({ result: result ?? null })
    .where(
      and(
        eq(idempotencyKeys.actor, actorLabel(context.actor)),
        eq(idempotencyKeys.verb, verb),
        eq(idempotencyKeys.key, key),
      ),
    );
}
