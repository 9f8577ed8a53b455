import "server-only";
import { eq } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { injectors, setInjectors } from "../../db/schema/injectors";

export type Placed = Awaited<ReturnType<typeof loadPlaced>>;

/** Every injector that stands or stood in the set, by its id there. */
export async function loadPlaced(connection: Connection, setId: string) {
  const rows = await connection
    .select({
      setInjectorId: setInjectors.id,
      position: setInjectors.position,
      tag: setInjectors.tag,
      serial: injectors.serial,
      state: setInjectors.state,
    })
    .from(setInjectors)
    .innerJoin(injectors, eq(injectors.id, setInjectors.injectorId))
    .where(eq(setInjectors.setId, setId));
  return new Map(rows.map((row) => [row.setInjectorId, row]));
}
