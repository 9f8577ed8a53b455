import "server-only";
import { eq } from "drizzle-orm";
import type { Context } from "../data/access/actor";
import { recordEvent } from "../data/audit/record-event";
import { database } from "../db/client";
import { people } from "../db/schema/people";
import { canonicalEmail } from "./canonical-email";
import { passwordMatches, spendTheSameTime } from "./password";
import { recordSignIn } from "./record-sign-in";
import { startSession } from "./session";
import { countWrongTry, forgetWrongTries, secondsToWait } from "./throttle";

type SignIn = { email: string; password: string; peer: string; browser: string };
type Answer =
  | { cookie: Awaited<ReturnType<typeof startSession>> }
  | { wrong: true }
  | { waitSeconds: number };

/** Unknown account, wrong password, disabled account and an account without a password give one answer. */
export async function signInWithPassword(
  context: Context,
  { email, password, peer, browser }: SignIn,
): Promise<Answer> {
  const guesser = { account: canonicalEmail(email), peer };
  const waitSeconds = await secondsToWait(guesser);
  if (waitSeconds > 0) return { waitSeconds };
  const person = await personWithPassword(guesser.account, password);
  if (!person) {
    await countWrongTry(guesser);
    await recordEvent(database(), context, { event: "sign-in failed", noun: "sign-in" });
    return { wrong: true };
  }
  await forgetWrongTries(guesser);
  const cookie = await startSession(person.id, browser);
  await recordSignIn(context, cookie.value);
  return { cookie };
}

async function personWithPassword(account: string, password: string) {
  const [person] = await database().select().from(people).where(eq(people.emailCanonical, account));
  if (!person?.active || !person.passwordHash) {
    await spendTheSameTime(password);
    return null;
  }
  return (await passwordMatches(person.passwordHash, password)) ? person : null;
}
