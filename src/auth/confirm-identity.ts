import "server-only";
import { eq, sql } from "drizzle-orm";
import type { Context } from "../data/access/actor";
import { requirePerson } from "../data/access/authorize";
import { recordEvent } from "../data/audit/record-event";
import { database } from "../db/client";
import { people, sessions } from "../db/schema/people";
import { passwordMatches } from "./password";
import { countWrongTry, secondsToWait } from "./throttle";

type Answer = "confirmed" | "wrong" | { waitSeconds: number };

/** The password once more, before a step such as release. */
export async function confirmIdentity(context: Context, password: string, peer: string): Promise<Answer> {
  const { personId, sessionId } = requirePerson(context);
  const [person] = await database().select().from(people).where(eq(people.id, personId));
  const guesser = { account: person?.emailCanonical ?? personId, peer };
  const waitSeconds = await secondsToWait(guesser);
  if (waitSeconds > 0) return { waitSeconds };
  if (!person?.passwordHash || !(await passwordMatches(person.passwordHash, password))) {
    await countWrongTry(guesser);
    await recordEvent(database(), context, { event: "sign-in failed", noun: "sign-in" });
    return "wrong";
  }
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
