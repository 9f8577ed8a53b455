import "server-only";
import { eq } from "drizzle-orm";
import type { Context } from "../data/access/actor";
import { requirePerson } from "../data/access/authorize";
import { recordEvent } from "../data/audit/record-event";
import { database } from "../db/client";
import { people } from "../db/schema/people";
import { passwordMatches } from "./password";
import { countWrongTry, secondsToWait } from "./throttle";

type Answer = "right" | "wrong" | { waitSeconds: number };

/** The password of whoever is signed in, asked for again. Guessing is throttled as at sign-in. */
export async function checkOwnPassword(context: Context, password: string, peer: string): Promise<Answer> {
  const { personId } = requirePerson(context);
  const [person] = await database().select().from(people).where(eq(people.id, personId));
  const guesser = { account: person?.emailCanonical ?? personId, peer };
  const waitSeconds = await secondsToWait(guesser);
  if (waitSeconds > 0) return { waitSeconds };
  if (person?.passwordHash && (await passwordMatches(person.passwordHash, password))) return "right";
  await countWrongTry(guesser);
  await recordEvent(database(), context, { event: "sign-in failed", noun: "sign-in" });
  return "wrong";
}
