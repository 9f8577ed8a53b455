import "server-only";
import { and, asc, eq, or, type SQL, sql } from "drizzle-orm";
import { customerPeople, people, personRoles } from "../../db/schema/people";
import type { Context } from "../access/actor";
import { containing } from "../containing";
import { pageOf } from "../page-of";
import { read } from "../read";
import { listPeopleInput, type peopleShown } from "./inputs";
import { personColumns } from "./person-columns";

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
      .select(personColumns)
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
