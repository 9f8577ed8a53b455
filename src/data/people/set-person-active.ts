import "server-only";
import { eq, sql } from "drizzle-orm";
import { endEntryLink } from "../../auth/entry-link";
import { people, sessions } from "../../db/schema/people";
import type { Context } from "../access/actor";
import { refused } from "../access/errors";
import { write } from "../write";
import { setPersonActiveInput } from "./inputs";
import { isSelf, lastManagerRefusal, lockPerson } from "./internal";

/** Disabling takes effect with the person's next request: every sign-in and an open link end with it. */
export function setPersonActive(context: Context, raw: unknown) {
  return write(
    context,
    "setPersonActive",
    setPersonActiveInput,
    raw,
    async ({ transaction, input: { personId, active }, record }) => {
      const person = await lockPerson(transaction, personId);
      if (isSelf(context, personId)) throw refused("Nobody disables their own account.");
      if (person.active === active)
        throw refused(`${person.name} is already ${active ? "enabled" : "disabled"}.`);
      await transaction
        .update(people)
        .set({ active, version: sql`${people.version} + 1` })
        .where(eq(people.id, personId))
        .catch((error: unknown) => {
          throw lastManagerRefusal(error);
        });
      if (!active) {
        await transaction.delete(sessions).where(eq(sessions.userId, personId));
        await endEntryLink(transaction, personId);
      }
      await record({
        event: active ? "person enabled" : "person disabled",
        noun: "person",
        objectId: personId,
      });
      return { personId };
    },
  );
}
