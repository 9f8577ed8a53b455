import "server-only";
import { randomUUID } from "node:crypto";
import { eq } from "drizzle-orm";
import { cookies, headers } from "next/headers";
import { cache } from "react";
import type { Actor, Context } from "../data/access/actor";
import { requireOwnOrigin } from "../data/edge/require-own-origin";
import { database } from "../db/client";
import { customerPeople, personRoles } from "../db/schema/people";
import { lucia, sessionIdOf } from "./session";

const recentSignInMs = 15 * 60_000;

/** Who asks. Read anew in every request, so that a change of role or a sign-out holds at once. */
export const currentContext = cache(async function currentContext(): Promise<Context> {
  const requestId = (await headers()).get("x-request-id") ?? randomUUID();
  const token = (await cookies()).get(lucia().sessionCookieName)?.value;
  return { actor: token ? await actorOf(token) : { kind: "anonymous" }, requestId };
});

/** For actions and handlers that change something: asked for by our own pages only. */
export async function currentWriter(): Promise<Context> {
  await requireOwnOrigin();
  return currentContext();
}

async function actorOf(token: string): Promise<Actor> {
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
