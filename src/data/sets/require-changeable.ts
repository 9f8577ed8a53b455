import "server-only";
import { eq } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { cycles } from "../../db/schema/cycles";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { invalid, refused } from "../access/errors";
import type { LockedSet } from "../course";

/** From the first cycle on, figures rest on what the counter wrote down. */
export async function requireChangeable(
  transaction: Transaction,
  context: Context,
  set: LockedSet,
  reason: string,
): Promise<void> {
  const [measured] = await transaction
    .select({ id: cycles.id })
    .from(cycles)
    .where(eq(cycles.setId, set.setId))
    .limit(1);
  if (!measured) return;
  if (!requirePerson(context).roles.includes("manager"))
    throw refused(`Set ${set.number} has been measured.`, [
      "From the first cycle on, the lab manager changes intake data, with a reason.",
    ]);
  if (!reason) throw invalid("reason", "Reason is missing: the set has been measured.");
}
