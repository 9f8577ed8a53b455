import "server-only";
import { eq, sql } from "drizzle-orm";
import { recordNow } from "../../db/columns";
import { toleranceClasses } from "../../db/schema/tolerance-classes";
import type { Context } from "../access/actor";
import { notFound } from "../access/errors";
import { write } from "../write";
import { setToleranceClassRetiredInput } from "./inputs";

/** A retired class is offered to no new set; the sets that have it keep it. */
export function setToleranceClassRetired(context: Context, raw: unknown) {
  return write(
    context,
    "setToleranceClassRetired",
    setToleranceClassRetiredInput,
    raw,
    async ({ transaction, input: { toleranceClassId, retired }, record }) => {
      const changed = await transaction
        .update(toleranceClasses)
        .set({ retiredAt: retired ? recordNow : null, version: sql`${toleranceClasses.version} + 1` })
        .where(eq(toleranceClasses.id, toleranceClassId))
        .returning({ name: toleranceClasses.name });
      if (changed.length === 0) throw notFound("tolerance class");
      await record({
        event: retired ? "tolerance class retired" : "tolerance class reinstated",
        noun: "tolerance class",
        objectId: toleranceClassId,
      });
      return { toleranceClassId };
    },
  );
}
