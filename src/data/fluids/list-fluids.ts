import "server-only";
import { asc, isNull, sql } from "drizzle-orm";
import { fluids } from "../../db/schema/fluids";
import type { Context } from "../access/actor";
import { read } from "../read";
import { listFluidsInput } from "./inputs";

/** Retired fluids only when asked for. A fluid without a density of its own is n-heptane. */
export function listFluids(context: Context, raw?: unknown) {
  return read(context, "listFluids", listFluidsInput, raw, ({ connection, input }) =>
    connection
      .select({
        fluidId: fluids.id,
        name: fluids.name,
        densityAt15GPerMl: fluids.densityAt15GPerMl,
        expansionPerK: fluids.expansionPerK,
        source: fluids.source,
        retired: sql<boolean>`${fluids.retiredAt} is not null`,
      })
      .from(fluids)
      .where(input.withRetired ? undefined : isNull(fluids.retiredAt))
      .orderBy(sql`${fluids.retiredAt} is not null`, asc(sql`lower(${fluids.name})`)),
  );
}
