import "server-only";
import { sql } from "drizzle-orm";
import { labDetails } from "../../db/schema/lab";
import type { Context } from "../access/actor";
import { noInput } from "../fields";
import { read } from "../read";

/** What every signed-in person may know of the lab: how to reach it, and the time by its own clock. */
export function getLabCard(context: Context, raw?: unknown) {
  return read(context, "getLabCard", noInput, raw, async ({ connection }) => {
    const [lab] = await connection
      .select({
        name: labDetails.name,
        phone: labDetails.phone,
        email: labDetails.email,
        zone: labDetails.timeZone,
        now: sql`record_now()`.mapWith((read) => new Date(read)),
      })
      .from(labDetails);
    const { zone, now, ...card } = lab!;
    return { ...card, clock: { now, zone } };
  });
}
