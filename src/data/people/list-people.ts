import "server-only";
import { and, asc, eq, or, type SQL, sql } from "drizzle-orm";
import { customers } from "../../db/schema/customers";
import { customerPeople, entryLinks, people, personRoles, sessions } from "../../db/schema/people";
import type { StaffRole } from "../../db/vocabulary";
import type { Context } from "../access/actor";
import { containing } from "../containing";
import { pageOf } from "../page-of";
import { read } from "../read";
import { listPeopleInput, type peopleShown } from "./inputs";

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

const isStaff = sql`exists (select from ${personRoles} where ${personRoles.personId} = ${people.id})`;
const isCustomers = sql`exists (select from ${customerPeople} where ${customerPeople.personId} = ${people.id})`;
const only: Record<(typeof peopleShown)[number], SQL | undefined> = {
  staff: and(people.active, isStaff),
  customers: and(people.active, isCustomers),
  disabled: eq(people.active, false),
};

export function listPeople(context: Context, raw?: unknown) {
  return read(context, "listPeople", listPeopleInput, raw ?? {}, async ({ connection, input }) => {
    const { offset, limit } = pageOf(input);
    const where = and(
      input.shown ? only[input.shown] : undefined,
      or(
        containing(sql`lower(${people.name})`, input.search),
        containing(sql`lower(${people.email})`, input.search),
      ),
    );
    const rows = await connection
      .select({
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
      })
      .from(people)
      .where(where)
      .orderBy(
        sql`not ${people.active}`,
        sql`not ${isStaff}`,
        asc(sql`lower(${people.name})`),
        asc(people.id),
      )
      .offset(offset)
      .limit(limit);
    return { rows, total: await connection.$count(people, where) };
  });
}
