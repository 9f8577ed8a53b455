import "server-only";
import { eq, sql } from "drizzle-orm";
import type { Context } from "../data/access/actor";
import { requirePerson } from "../data/access/authorize";
import { recordEvent } from "../data/audit/record-event";
import { database } from "../db/client";
import { sessions } from "../db/schema/people";
import { checkOwnPassword } from "./check-own-password";

type Answer = "confirmed" | "wrong" | { waitSeconds: number };

/** The password once more, before a step such as release. */
export async function confirmIdentity(context: Context, password: string, peer: string): Promise<Answer> {
  const { personId, sessionId } = requirePerson(context);
  const answer = await checkOwnPassword(context, password, peer);
  if (answer !== "right") return answer;
  await database().transaction(async (transaction) => {
    await transaction.update(sessions).set({ authenticatedAt: sql`now()` }).where(eq(sessions.id, sessionId));
    await recordEvent(transaction, context, {
      event: "identity confirmed",
      noun: "person",
      objectId: personId,
    });
  });
  return "confirmed";
}
