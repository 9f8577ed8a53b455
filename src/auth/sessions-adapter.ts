import "server-only";
import { DrizzlePostgreSQLAdapter } from "@lucia-auth/adapter-drizzle";
import { and, eq, gt, sql } from "drizzle-orm";
import type { Adapter } from "lucia";
import { database } from "../db/client";
import { people, sessions } from "../db/schema/people";

/** How long a sign-in lasts without use and at most: staff 60 min and 12 h, customers 24 h and 7 days. */
const isStaff = sql`exists (select from person_roles where person_roles.person_id = ${sessions.userId})`;
const idle = sql`case when ${isStaff} then interval '60 minutes' else interval '24 hours' end`;
const absolute = sql`case when ${isStaff} then interval '12 hours' else interval '7 days' end`;

/**
 * lucia knows one sliding time and the application's clock. Here the database's clock and the person's role decide,
 * so lucia is told that whatever the database still returns is alive.
 */
export function sessionsAdapter(): Adapter {
  const db = database();
  const plain = new DrizzlePostgreSQLAdapter(db, sessions, people);
  const alive = and(gt(sessions.expiresAt, sql`now()`), sql`${sessions.createdAt} > now() - ${absolute}`);
  return {
    deleteSession: (id) => plain.deleteSession(id),
    deleteUserSessions: (personId) => plain.deleteUserSessions(personId),
    getUserSessions: (personId) => plain.getUserSessions(personId),
    deleteExpiredSessions: () => plain.deleteExpiredSessions(),
    async getSessionAndUser(id) {
      const [row] = await db
        .select({ session: sessions, person: { id: people.id, name: people.name } })
        .from(sessions)
        .innerJoin(people, eq(people.id, sessions.userId))
        .where(and(eq(sessions.id, id), eq(people.active, true), alive));
      if (!row) return [null, null];
      const { id: sessionId, userId, ...attributes } = row.session;
      const session = { id: sessionId, userId, expiresAt: new Date(Date.now() + 60_000), attributes };
      return [session, { id: row.person.id, attributes: { name: row.person.name } }];
    },
    async setSession({ id, userId, attributes }) {
      await db.insert(sessions).values({ id, userId, expiresAt: sql`now()`, ...attributes });
      await db
        .update(sessions)
        .set({ expiresAt: sql`now() + ${idle}` })
        .where(eq(sessions.id, id));
    },
    async updateSessionExpiration(id) {
      await db
        .update(sessions)
        .set({ expiresAt: sql`now() + ${idle}` })
        .where(and(eq(sessions.id, id), sql`${sessions.expiresAt} < now() + ${idle} - interval '1 minute'`));
    },
  };
}
