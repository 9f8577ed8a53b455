import "server-only";
import { eq } from "drizzle-orm";
import { sessions } from "../../db/schema/people";
import type { Context } from "../access/actor";
import { write } from "../write";
import { endPersonSignInsInput } from "./inputs";
import { lockPerson } from "./internal";

export function endPersonSignIns(context: Context, raw: unknown) {
  return write(
    context,
    "endPersonSignIns",
    endPersonSignInsInput,
    raw,
    async ({ transaction, input: { personId }, record }) => {
      await lockPerson(transaction, personId);
      const ended = await transaction
        .delete(sessions)
        .where(eq(sessions.userId, personId))
        .returning({ id: sessions.id });
      await record({
        event: "sign-in ended",
        noun: "person",
        objectId: personId,
        after: { ended: ended.length },
      });
      return { personId, ended: ended.length };
    },
  );
}
