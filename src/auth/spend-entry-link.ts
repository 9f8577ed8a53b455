import "server-only";
import type { Context } from "../data/access/actor";
import { recordEvent } from "../data/audit/record-event";
import { database } from "../db/client";
import { canonicalEmail } from "./canonical-email";
import { findEntryLink, markEntryLinkUsed } from "./entry-link";
import { recordSignIn } from "./record-sign-in";
import { startSession } from "./session";
import { checkNewPassword, storePassword } from "./set-password";
import { countWrongTry, forgetWrongTries, secondsToWait } from "./throttle";

type Spending = { token: string; password: string; peer: string; browser: string };
type Answer =
  | { cookie: Awaited<ReturnType<typeof startSession>>; personId: string }
  | { gone: true }
  | { problem: string }
  | { waitSeconds: number };

/** Sets the password of the person whose link it is and signs them in. Every other sign-in of theirs ends. */
export async function spendEntryLink(
  context: Context,
  { token, password, peer, browser }: Spending,
): Promise<Answer> {
  const guesser = { account: `entry link ${token}`, peer };
  const waitSeconds = await secondsToWait(guesser);
  if (waitSeconds > 0) return { waitSeconds };
  const link = await findEntryLink(database(), token);
  if (!link) {
    await countWrongTry(guesser);
    await recordEvent(database(), context, { event: "sign-in failed", noun: "sign-in" });
    return { gone: true };
  }
  const { personId } = link;
  const checked = await checkNewPassword(database(), personId, password);
  if ("problem" in checked) return checked;
  const spent = await database().transaction(async (transaction) => {
    if (!(await markEntryLinkUsed(transaction, link.tokenHash))) return false;
    await storePassword(transaction, { personId, hash: checked.hash });
    await recordEvent(transaction, context, { event: "password set", noun: "person", objectId: personId });
    return true;
  });
  if (!spent) return { gone: true };
  await forgetWrongTries({ account: canonicalEmail(link.email), peer });
  const cookie = await startSession(personId, browser);
  await recordSignIn(context, cookie.value);
  return { cookie, personId };
}
