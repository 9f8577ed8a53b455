import "server-only";
import { inArray, type SQL, sql } from "drizzle-orm";
import { labDetails } from "../../db/schema/lab";
import { sets } from "../../db/schema/sets";
import { openStages } from "../../db/vocabulary";
import type { Grant } from "../access/authorize";

/** The sets that the actor reaches: all, or those of the customers acted for. */
export function setsWithin(grant: Grant): SQL | undefined {
  return grant.customerIds ? inArray(sets.customerId, [...grant.customerIds]) : undefined;
}

/** The day it is in the lab. Needs lab_details in the query. */
export const labToday = sql`(record_now() at time zone ${labDetails.timeZone})::date`;

const worked = sql`${sets.stage} in (${sql.join(
  openStages.map((stage) => sql`${stage}`),
  sql`, `,
)})`;

/** Promised for a day that is over, and still worked on. */
export const isLate = sql<boolean>`(${worked} and ${sets.promisedOn} < ${labToday})`;
export const daysLate = sql<number>`case when ${isLate} then ${labToday} - ${sets.promisedOn} else 0 end`;
