import "server-only";
import { makeEntryLink } from "../../auth/entry-link";
import type { Context } from "../access/actor";
import { refused } from "../access/errors";
import { write } from "../write";
import { renewEntryLinkInput } from "./inputs";
import { lockPerson } from "./internal";

/** A new link to set a password; the one before it ends. It is handed over once and stored nowhere. */
export async function renewEntryLink(context: Context, raw: unknown) {
  let entryLink: string | null = null;
  const kept = await write(
    context,
    "renewEntryLink",
    renewEntryLinkInput,
    raw,
    async ({ transaction, input: { personId }, record }) => {
      const person = await lockPerson(transaction, personId);
      if (!person.active) throw refused(`${person.name} is disabled.`, ["Enable the account first."]);
      entryLink = await makeEntryLink(transaction, personId);
      await record({ event: "entry link made", noun: "person", objectId: personId });
      return { personId };
    },
  );
  return { ...kept, entryLink: entryLink as string | null };
}
