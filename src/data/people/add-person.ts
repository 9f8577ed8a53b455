import "server-only";
import { canonicalEmail } from "../../auth/canonical-email";
import { makeEntryLink } from "../../auth/entry-link";
import { brokenConstraint } from "../../db/lost-connection";
import { people } from "../../db/schema/people";
import type { Context } from "../access/actor";
import { invalid } from "../access/errors";
import { write } from "../write";
import { addPersonInput } from "./inputs";
import { insertDuties } from "./internal";

/**
 * The link is handed over once and stored nowhere; when the same form comes again it is null, and a new one can be
 * made.
 */
export async function addPerson(context: Context, raw: unknown) {
  let entryLink: string | null = null;
  const kept = await write(
    context,
    "addPerson",
    addPersonInput,
    raw,
    async ({ transaction, input, record }) => {
      const { name, email, kind, customerId } = input;
      const roles = kind === "staff" ? input.roles : [];
      const customerIds = kind === "customer" && customerId ? [customerId] : [];
      const [added] = await transaction
        .insert(people)
        .values({ name, email, emailCanonical: canonicalEmail(email) })
        .returning({ personId: people.id })
        .catch((error: unknown) => {
          if (brokenConstraint(error) === "people_one_account_per_email")
            throw invalid("email", "There is already an account with this e-mail.");
          throw error;
        });
      const { personId } = added!;
      await insertDuties(transaction, personId, { roles, customerIds });
      entryLink = await makeEntryLink(transaction, personId);
      // Names and addresses stay out of the activity record, so that they can be erased.
      await record({
        event: "person added",
        noun: "person",
        objectId: personId,
        after: { roles, customerIds },
      });
      return { personId };
    },
  );
  return { ...kept, entryLink: entryLink as string | null };
}
