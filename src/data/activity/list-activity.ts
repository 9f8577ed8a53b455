import "server-only";
import { and, desc, eq, type SQL, sql } from "drizzle-orm";
import type { z } from "zod";
import { activity } from "../../db/schema/activity";
import { labDetails } from "../../db/schema/lab";
import { people } from "../../db/schema/people";
import { sets } from "../../db/schema/sets";
import type { Context } from "../access/actor";
import { pageOf } from "../page-of";
import { read } from "../read";
import { listActivityInput } from "./inputs";
import { objectName } from "./object-name";

/** Who did what, newest first. The record holds ids; names are those of today. */
export function listActivity(context: Context, raw: unknown) {
  return read(context, "listActivity", listActivityInput, raw, async ({ connection, input }) => {
    const { offset, limit } = pageOf(input);
    const where = asked(input);
    const rows = await connection
      .select({
        position: activity.position,
        at: activity.at,
        personName: people.name,
        actor: activity.actor,
        roles: activity.roles,
        event: activity.event,
        noun: activity.noun,
        objectId: activity.objectId,
        objectName,
        setId: activity.setId,
        setNumber: sets.number,
        before: activity.before,
        after: activity.after,
        reason: activity.reason,
        requestId: activity.requestId,
        hash: activity.hash,
      })
      .from(activity)
      .innerJoin(labDetails, eq(labDetails.id, 1))
      .leftJoin(people, eq(people.id, activity.personId))
      .leftJoin(sets, eq(sets.id, activity.setId))
      .where(where)
      .orderBy(desc(activity.position))
      .limit(limit)
      .offset(offset);
    const [counted] = await connection
      .select({ total: sql<number>`count(*)::int` })
      .from(activity)
      .innerJoin(labDetails, eq(labDetails.id, 1))
      .where(where);
    return { rows, total: counted!.total };
  });
}

function asked({ personId, setId, event, from, until }: z.output<typeof listActivityInput>): SQL | undefined {
  const startOf = (day: string, plus: number) =>
    sql`((${day}::date + ${plus}::int)::timestamp at time zone ${labDetails.timeZone})`;
  return and(
    personId ? eq(activity.personId, personId) : undefined,
    setId ? eq(activity.setId, setId) : undefined,
    event ? eq(activity.event, event) : undefined,
    from ? sql`${activity.at} >= ${startOf(from, 0)}` : undefined,
    until ? sql`${activity.at} < ${startOf(until, 1)}` : undefined,
  );
}
