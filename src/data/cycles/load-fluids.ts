import "server-only";
import { asc, isNull } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { fluids } from "../../db/schema/fluids";

/** The fluids that a cycle may name. */
export function loadFluids(connection: Connection) {
  return connection
    .select({
      fluidId: fluids.id,
      name: fluids.name,
      densityAt15GPerMl: fluids.densityAt15GPerMl,
      expansionPerK: fluids.expansionPerK,
    })
    .from(fluids)
    .where(isNull(fluids.retiredAt))
    .orderBy(asc(fluids.name));
}
