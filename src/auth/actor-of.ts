import "server-only";
import { eq } from "drizzle-orm";
import type { Actor } from "../data/access/actor";
import { database } from "../db/client";
import { customerPeople, personRoles } from "../db/schema/people";
import { lucia, sessionIdOf } from "./session";

const recentSignInMs = 15 * 60_000;

/** Who carries this token, with the roles they have now. */
export async function actorOf(token: string): Promise<Actor> {
  const { session, user } = await lucia().validateSession(sessionIdOf(token));
  if (!session) return { kind: "anonymous" };
  const [roles, customers] = await Promise.all([
    database().select({ role: personRoles.role }).from(personRoles).where(eq(personRoles.personId, user.id)),
    database()
      .select({ id: customerPeople.customerId })
      .from(customerPeople)
      .where(eq(customerPeople.personId, user.id)),
  ]);
  const customerIds = customers.map((customer) => customer.id);
  return {
    kind: "person",
    personId: user.id,
    name: user.name,
    roles: [...roles.map((row) => row.role), ...(customerIds.length > 0 ? (["customer"] as const) : [])],
    customerIds,
    sessionId: session.id,
    authenticatedRecently: Date.now() - (session.authenticatedAt?.getTime() ?? 0) < recentSignInMs,
  };
}
