import "server-only";
import { asc, desc, eq } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { cycleInjectors, cycleRevisions } from "../../db/schema/cycles";
import { injectors, setInjectors } from "../../db/schema/injectors";
import { injectorsInSet } from "./internal";
import type { OpenDraft } from "./lock-open-draft";
import type { SheetInjector } from "./sheet/types";

/** The injectors that a sheet is about: those in the set now, or in a correction those that were measured. */
export async function injectorsOfDraft(connection: Connection, draft: OpenDraft): Promise<SheetInjector[]> {
  if (!draft.correctsCycleId) return injectorsInSet(connection, draft.setId);
  const latest = connection
    .select({ id: cycleRevisions.id })
    .from(cycleRevisions)
    .where(eq(cycleRevisions.cycleId, draft.correctsCycleId))
    .orderBy(desc(cycleRevisions.revision))
    .limit(1);
  return connection
    .select({
      setInjectorId: setInjectors.id,
      position: setInjectors.position,
      tag: setInjectors.tag,
      serial: injectors.serial,
    })
    .from(cycleInjectors)
    .innerJoin(setInjectors, eq(setInjectors.id, cycleInjectors.setInjectorId))
    .innerJoin(injectors, eq(injectors.id, setInjectors.injectorId))
    .where(eq(cycleInjectors.revisionId, latest))
    .orderBy(asc(setInjectors.position), asc(setInjectors.tag));
}
