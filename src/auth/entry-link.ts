import "server-only";
import { createHash, randomBytes } from "node:crypto";
import { and, eq, isNull, sql } from "drizzle-orm";
import type { Connection, Transaction } from "../db/client";
import { recordNow } from "../db/columns";
import { entryLinks, people } from "../db/schema/people";
import { settings } from "../settings";

const hashOf = (token: string) => createHash("sha256").update(token).digest("hex");

/** A link by which the person sets a password, once, within 72 hours. Only its hash is stored; an older one ends. */
export async function makeEntryLink(transaction: Transaction, personId: string): Promise<string> {
  const token = randomBytes(32).toString("base64url");
  await endEntryLink(transaction, personId);
  await transaction
    .insert(entryLinks)
    .values({ tokenHash: hashOf(token), personId, expiresAt: sql`${recordNow} + interval '72 hours'` });
  return `${settings().APP_ORIGIN}/welcome/${token}`;
}

export async function endEntryLink(transaction: Transaction, personId: string): Promise<void> {
  await transaction
    .delete(entryLinks)
    .where(and(eq(entryLinks.personId, personId), isNull(entryLinks.usedAt)));
}

/** Whose link it is while it can be used. Looking does not spend it. */
export async function findEntryLink(connection: Connection, token: string) {
  const [found] = await connection
    .select({ personId: people.id, name: people.name, email: people.email, tokenHash: entryLinks.tokenHash })
    .from(entryLinks)
    .innerJoin(people, eq(people.id, entryLinks.personId))
    .where(
      and(
        eq(entryLinks.tokenHash, hashOf(token)),
        isNull(entryLinks.usedAt),
        sql`${entryLinks.expiresAt} > ${recordNow}`,
        people.active,
      ),
    );
  return found ?? null;
}

/** True for the one that spends it; of two at once the second finds it used. */
export async function markEntryLinkUsed(transaction: Transaction, tokenHash: string): Promise<boolean> {
  const used = await transaction
    .update(entryLinks)
    .set({ usedAt: recordNow })
    .where(and(eq(entryLinks.tokenHash, tokenHash), isNull(entryLinks.usedAt)))
    .returning({ tokenHash: entryLinks.tokenHash });
  return used.length === 1;
}
