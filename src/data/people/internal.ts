import "server-only";
import { eq, sql } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { brokenConstraint } from "../../db/lost-connection";
import { customerPeople, people, personRoles, sessions } from "../../db/schema/people";
import type { StaffRole } from "../../db/vocabulary";
import type { Context } from "../access/actor";
import { notFound, refused } from "../access/errors";

/** The person's row, locked until the transaction ends. */
export async function lockPerson(transaction: Transaction, personId: string) {
  const [found] = await transaction
    .select({ personId: people.id, name: people.name, active: people.active, version: people.version })
    .from(people)
    .where(eq(people.id, personId))
    .for("update");
  if (!found) throw notFound("person");
  return found;
}

export function isSelf(context: Context, personId: string): boolean {
  return context.actor.kind === "person" && context.actor.personId === personId;
}

type Duties = { roles: readonly StaffRole[]; customerIds: readonly string[] };

export async function loadDuties(transaction: Transaction, personId: string) {
  const roles = await transaction
    .select({ role: personRoles.role })
    .from(personRoles)
    .where(eq(personRoles.personId, personId));
  const actsFor = await transaction
    .select({ customerId: customerPeople.customerId })
    .from(customerPeople)
    .where(eq(customerPeople.personId, personId));
  return { roles: roles.map((row) => row.role), customerIds: actsFor.map((row) => row.customerId).sort() };
}

export async function insertDuties(
  transaction: Transaction,
  personId: string,
  { roles, customerIds }: Duties,
): Promise<void> {
  if (roles.length > 0)
    await transaction.insert(personRoles).values(roles.map((role) => ({ personId, role })));
  if (customerIds.length > 0)
    await transaction
      .insert(customerPeople)
      .values(customerIds.map((customerId) => ({ personId, customerId })))
      .catch((error: unknown) => {
        if (brokenConstraint(error)?.includes("customer_id")) throw notFound("customer");
        throw error;
      });
}

/** The database keeps at least one active manager; here it is said what to do. */
export function lastManagerRefusal(error: unknown): unknown {
  return brokenConstraint(error) === "people_manager_remains"
    ? refused("The lab would be left without a manager.", ["Make somebody else a manager first."])
    : error;
}

/** How a sign-in is named outside of the database: a piece of its hash, of no use as a cookie. */
export const signInId = sql<string>`left(${sessions.id}, 16)`;
