import "server-only";
import { and, eq, ne } from "drizzle-orm";
import type { Connection, Transaction } from "../db/client";
import { customers } from "../db/schema/customers";
import { labDetails } from "../db/schema/lab";
import { customerPeople, people, sessions } from "../db/schema/people";
import { hashPassword } from "./password";
import { passwordProblem } from "./password-problem";

type Checked = { problem: string } | { hash: string };

/** The hash to store, made before a transaction is opened, or what is wrong with the password. */
export async function checkNewPassword(
  connection: Connection,
  personId: string,
  password: string,
): Promise<Checked> {
  const problem = passwordProblem(password, await wordsAbout(connection, personId));
  return problem ? { problem } : { hash: await hashPassword(password) };
}

/** Every other sign-in of the person ends with the old password. */
export async function storePassword(
  transaction: Transaction,
  { personId, hash, keepSessionId = "" }: { personId: string; hash: string; keepSessionId?: string },
): Promise<void> {
  await transaction.update(people).set({ passwordHash: hash }).where(eq(people.id, personId));
  await transaction
    .delete(sessions)
    .where(and(eq(sessions.userId, personId), ne(sessions.id, keepSessionId)));
}

/** What anybody would try first for this person. */
async function wordsAbout(connection: Connection, personId: string): Promise<string[]> {
  const [lab, person, actsFor] = await Promise.all([
    connection.select({ name: labDetails.name }).from(labDetails),
    connection.select({ name: people.name, email: people.email }).from(people).where(eq(people.id, personId)),
    connection
      .select({ name: customers.name })
      .from(customerPeople)
      .innerJoin(customers, eq(customers.id, customerPeople.customerId))
      .where(eq(customerPeople.personId, personId)),
  ]);
  return [...lab, ...person, ...actsFor].flatMap((row) => Object.values(row));
}
