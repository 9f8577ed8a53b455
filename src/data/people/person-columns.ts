import "server-only";
import { sql } from "drizzle-orm";
import { customers } from "../../db/schema/customers";
import { customerPeople, entryLinks, people, personRoles, sessions } from "../../db/schema/people";
import type { StaffRole } from "../../db/vocabulary";

const roles = sql<StaffRole[]>`array(select ${personRoles.role} from ${personRoles}
  where ${personRoles.personId} = ${people.id} order by 1)`;
const actsFor = sql<{ customerId: string; name: string }[]>`coalesce((
  select jsonb_agg(jsonb_build_object('customerId', ${customers.id}, 'name', ${customers.name})
    order by lower(${customers.name}))
  from ${customerPeople} join ${customers} on ${customers.id} = ${customerPeople.customerId}
  where ${customerPeople.personId} = ${people.id}), '[]')`;
const openSignIns = sql<number>`(select count(*)::int from ${sessions}
  where ${sessions.userId} = ${people.id} and ${sessions.expiresAt} > now())`;
const linkUntil = sql<Date | null>`(select ${entryLinks.expiresAt} from ${entryLinks}
  where ${entryLinks.personId} = ${people.id} and ${entryLinks.usedAt} is null
    and ${entryLinks.expiresAt} > record_now())`.mapWith(entryLinks.expiresAt);

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
