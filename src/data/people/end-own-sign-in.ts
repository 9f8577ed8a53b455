import "server-only";
import { and, eq } from "drizzle-orm";
import { sessions } from "../../db/schema/people";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { notFound } from "../access/errors";
import { write } from "../write";
import { endOwnSignInInput } from "./inputs";
import { signInId } from "./internal";

export function endOwnSignIn(context: Context, raw: unknown) {
  return write(context, "endOwnSignIn", endOwnSignInInput, raw, async ({ transaction, input, record }) => {
    const { personId } = requirePerson(context);
    const ended = await transaction
      .delete(sessions)
      .where(and(eq(sessions.userId, personId), eq(signInId, input.signInId)))
      .returning({ id: sessions.id });
    if (ended.length === 0) throw notFound("open sign-in");
    await record({ event: "sign-in ended", noun: "person", objectId: personId });
    return { ended: ended.length };
  });
}
