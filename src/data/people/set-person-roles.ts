import "server-only";
import { eq, sql } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { customerPeople, people, personRoles } from "../../db/schema/people";
import type { Context } from "../access/actor";
import { refused } from "../access/errors";
import { requireSameVersion } from "../require-same-version";
import { write } from "../write";
import { setPersonRolesInput } from "./inputs";
import { insertDuties, isSelf, lastManagerRefusal, loadDuties, lockPerson } from "./internal";

const labels = { roles: "Roles", customerIds: "Acts for" };

/** What a person may do: their roles in the lab and the customers they act for. It holds from their next request. */
export function setPersonRoles(context: Context, raw: unknown) {
  return write(
    context,
    "setPersonRoles",
    setPersonRolesInput,
    raw,
    async ({ transaction, input, record }) => {
      const { personId, version, roles, customerIds } = input;
      const person = await lockPerson(transaction, personId);
      if (isSelf(context, personId)) throw refused("Nobody sets their own roles.");
      const before = await loadDuties(transaction, personId);
      requireSameVersion({
        stored: { ...before, version: person.version },
        version,
        values: { roles, customerIds },
        labels,
      });
      await transaction.delete(personRoles).where(eq(personRoles.personId, personId));
      await transaction.delete(customerPeople).where(eq(customerPeople.personId, personId));
      await insertDuties(transaction, personId, { roles, customerIds });
      await requireManagerRemains(transaction);
      await transaction
        .update(people)
        .set({ version: sql`${people.version} + 1` })
        .where(eq(people.id, personId));
      await record({
        event: "roles set",
        noun: "person",
        objectId: personId,
        before,
        after: { roles, customerIds },
      });
      return { personId };
    },
  );
}

/** The rule is deferred to the end of the transaction; asked for now, its answer can still be said in words. */
async function requireManagerRemains(transaction: Transaction): Promise<void> {
  await transaction.execute(sql`set constraints person_roles_manager_remains immediate`).catch((error) => {
    throw lastManagerRefusal(error);
  });
}
