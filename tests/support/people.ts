import { randomUUID } from "node:crypto";
import { lucia, sessionIdOf, startSession } from "../../src/auth/session";
import { checkNewPassword, storePassword } from "../../src/auth/set-password";
import type { Context } from "../../src/data/access/actor";
import { database } from "../../src/db/client";

export const password = "nine copper lanterns drifting";

export function nobody(): Context {
  return { actor: { kind: "anonymous" }, requestId: randomUUID() };
}

/** What a set-up link does, without the link. */
export async function givePassword(personId: string, chosen = password): Promise<void> {
  const checked = await checkNewPassword(database(), personId, chosen);
  if ("problem" in checked) throw new Error(checked.problem);
  await database().transaction((transaction) => storePassword(transaction, { personId, hash: checked.hash }));
}

/** The token that the person's browser carries from now on. */
export async function tokenOf(personId: string): Promise<string> {
  return (await startSession(personId, "a browser")).value;
}

export async function isSignedIn(token: string): Promise<boolean> {
  return (await lucia().validateSession(sessionIdOf(token))).session !== null;
}
