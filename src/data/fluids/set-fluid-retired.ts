import "server-only";
import { eq, sql } from "drizzle-orm";
import { recordNow } from "../../db/columns";
import { fluids } from "../../db/schema/fluids";
import type { Context } from "../access/actor";
import { notFound } from "../access/errors";
import { write } from "../write";
import { setFluidRetiredInput } from "./inputs";

/** A retired fluid is offered to no new cycle; what was measured with it keeps it. */
export function setFluidRetired(context: Context, raw: unknown) {
  return write(
    context,
    "setFluidRetired",
    setFluidRetiredInput,
    raw,
    async ({ transaction, input: { fluidId, retired }, record }) => {
      const changed = await transaction
        .update(fluids)
        .set({ retiredAt: retired ? recordNow : null, version: sql`${fluids.version} + 1` })
        .where(eq(fluids.id, fluidId))
        .returning({ fluidId: fluids.id });
      if (changed.length === 0) throw notFound("fluid");
      await record({
        event: retired ? "fluid retired" : "fluid reinstated",
        noun: "fluid",
        objectId: fluidId,
      });
      return { fluidId };
    },
  );
}
