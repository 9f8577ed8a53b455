import "server-only";
import { sql } from "drizzle-orm";
import { entryLinks, people } from "../../db/schema/people";
import type { StaffRole } from "../../db/vocabulary";

// Written out, since drizzle leaves the tables' names out of a selection from one table.
const roles = sql<
  StaffRole[]
>`array(select r.role from person_roles r where r.person_id = people.person_id order by 1)`;
const actsFor = sql<{ customerId: string; name: string }[]>`coalesce((
  select jsonb_agg(jsonb_build_object('customerId', c.customer_id, 'name', c.name) order by lower(c.name))
  from customer_people p join customers c on c.customer_id = p.customer_id
  where p.person_id = people.person_id), '[]')`;
const openSignIns = sql<number>`(select count(*)::int from sessions s
  where s.person_id = people.person_id and s.expires_at > now())`;
const linkUntil = sql<Date | null>`(select l.expires_at from entry_links l
  where l.person_id = people.person_id and l.used_at is null and l.expires_at > record_now())`.mapWith(
  entryLinks.expiresAt,
);

/** What the manager sees of an account. */
export const personColumns = {
  personId: people.id,
  name: people.name,
  email: people.email,
  active: people.active,
  version: people.version,
  hasPassword: sql<boolean>`${people.passwordHash} is not null`,
  roles,
  actsFor,
  openSignIns,
  linkUntil,
};
