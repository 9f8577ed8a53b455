import "server-only";
import { and, asc, eq } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { injectors, setInjectors } from "../../db/schema/injectors";
import type { SheetInjector } from "./sheet/types";

/** The injectors that are in the set now, by place. */
export async function injectorsInSet(connection: Connection, setId: string): Promise<SheetInjector[]> {
  return connection
    .select({
      setInjectorId: setInjectors.id,
      position: setInjectors.position,
      tag: setInjectors.tag,
      serial: injectors.serial,
    })
    .from(setInjectors)
    .innerJoin(injectors, eq(injectors.id, setInjectors.injectorId))
    .where(and(eq(setInjectors.setId, setId), eq(setInjectors.state, "in set")))
    .orderBy(asc(setInjectors.position));
}
