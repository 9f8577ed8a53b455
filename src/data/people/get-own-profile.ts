import "server-only";
import { desc, eq, sql } from "drizzle-orm";
import { customers } from "../../db/schema/customers";
import { customerPeople, people, personRoles, sessions } from "../../db/schema/people";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { noInput } from "../fields";
import { read } from "../read";
import { signInId } from "./internal";

/** The person's own name, duties and open sign-ins, the newest first. */
export function getOwnProfile(context: Context, raw?: unknown) {
  return read(context, "getOwnProfile", noInput, raw, async ({ connection }) => {
    const { personId, sessionId } = requirePerson(context);
    const [own] = await connection
      .select({ name: people.name, email: people.email })
      .from(people)
      .where(eq(people.id, personId));
    const roles = await connection
      .select({ role: personRoles.role })
      .from(personRoles)
      .where(eq(personRoles.personId, personId));
    const actsFor = await connection
      .select({ name: customers.name })
      .from(customerPeople)
      .innerJoin(customers, eq(customers.id, customerPeople.customerId))
      .where(eq(customerPeople.personId, personId));
    const signIns = await connection
      .select({
        signInId,
        browser: sessions.browser,
        since: sessions.createdAt,
        isThisOne: sql<boolean>`${sessions.id} = ${sessionId}`,
      })
      .from(sessions)
      .where(sql`${sessions.userId} = ${personId} and ${sessions.expiresAt} > now()`)
      .orderBy(desc(sessions.createdAt));
    return {
      ...own!,
      roles: roles.map((row) => row.role),
      actsFor: actsFor.map((row) => row.name),
      signIns,
    };
  });
}
