import "server-only";
import { checkOwnPassword } from "../../auth/check-own-password";
import { checkNewPassword, storePassword } from "../../auth/set-password";
import { database } from "../../db/client";
import type { Context } from "../access/actor";
import { authorize, requirePerson } from "../access/authorize";
import { busy, invalid } from "../access/errors";
import { parseInput } from "../parse-input";
import { write } from "../write";
import { changeOwnPasswordInput } from "./inputs";

/**
 * Asks for the old password; every other sign-in of the person ends. The slow hashing is done before a transaction is
 * opened, and a wrong try is counted although nothing is changed.
 */
export async function changeOwnPassword(context: Context, raw: unknown, peer = "unknown") {
  await authorize(context, "changeOwnPassword");
  const { personId, sessionId } = requirePerson(context);
  const { oldPassword, newPassword } = parseInput(changeOwnPasswordInput, raw);
  await requireOldPassword(context, oldPassword, peer);
  const checked = await checkNewPassword(database(), personId, newPassword);
  if ("problem" in checked) throw invalid("newPassword", checked.problem);
  return write(context, "changeOwnPassword", changeOwnPasswordInput, raw, async ({ transaction, record }) => {
    await storePassword(transaction, { personId, hash: checked.hash, keepSessionId: sessionId });
    await record({ event: "password set", noun: "person", objectId: personId });
    return {};
  });
}

async function requireOldPassword(context: Context, password: string, peer: string): Promise<void> {
  const answer = await checkOwnPassword(context, password, peer);
  if (answer === "wrong") throw invalid("oldPassword", "This is not your password.");
  if (answer !== "right")
    throw busy(
      `Too many wrong tries. Please wait ${Math.ceil(answer.waitSeconds / 60)} min and try again.`,
      answer.waitSeconds,
    );
}
