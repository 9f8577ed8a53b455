import "server-only";
import { and, asc, desc, eq, inArray, ne } from "drizzle-orm";
import { alias } from "drizzle-orm/pg-core";
import type { Connection } from "../../db/client";
import { injectorRejections, injectors, setInjectors } from "../../db/schema/injectors";
import { people } from "../../db/schema/people";
import { sets } from "../../db/schema/sets";
import type { Grant } from "../access/authorize";
import { setsWithin } from "./internal";
import type { EarlierVisit, SetInjector } from "./types";

const replaced = alias(setInjectors, "replaced");

export async function loadInjectors(
  connection: Connection,
  setId: string,
  grant: Grant,
): Promise<SetInjector[]> {
  const [rows, visits] = await Promise.all([
    selectInjectors(connection, setId),
    loadVisits(connection, setId, grant),
  ]);
  return rows.map(({ rejectedReason, rejectedAt, rejectedBy, ...row }) => ({
    ...row,
    rejection: rejectedReason ? { reason: rejectedReason, at: rejectedAt!, by: rejectedBy! } : null,
    earlierVisits: visits.get(row.injectorId) ?? [],
  }));
}

function selectInjectors(connection: Connection, setId: string) {
  return connection
    .select({
      setInjectorId: setInjectors.id,
      injectorId: setInjectors.injectorId,
      position: setInjectors.position,
      tag: setInjectors.tag,
      serial: injectors.serial,
      marking: setInjectors.marking,
      condition: setInjectors.condition,
      conditionNote: setInjectors.conditionNote,
      state: setInjectors.state,
      replacesTag: replaced.tag,
      rejectedReason: injectorRejections.reason,
      rejectedAt: injectorRejections.rejectedAt,
      rejectedBy: people.name,
    })
    .from(setInjectors)
    .innerJoin(injectors, eq(injectors.id, setInjectors.injectorId))
    .leftJoin(replaced, eq(replaced.id, setInjectors.replacesId))
    .leftJoin(injectorRejections, eq(injectorRejections.setInjectorId, setInjectors.id))
    .leftJoin(people, eq(people.id, injectorRejections.rejectedBy))
    .where(eq(setInjectors.setId, setId))
    .orderBy(asc(setInjectors.position), asc(setInjectors.tag));
}

/** Other visits of the same injectors. A customer sees those under their own name only. */
async function loadVisits(
  connection: Connection,
  setId: string,
  grant: Grant,
): Promise<Map<string, EarlierVisit[]>> {
  const here = connection
    .select({ injectorId: setInjectors.injectorId })
    .from(setInjectors)
    .where(eq(setInjectors.setId, setId));
  const rows = await connection
    .selectDistinct({
      injectorId: setInjectors.injectorId,
      setId: sets.id,
      number: sets.number,
      checkedInAt: sets.checkedInAt,
    })
    .from(setInjectors)
    .innerJoin(sets, eq(sets.id, setInjectors.setId))
    .where(and(inArray(setInjectors.injectorId, here), ne(sets.id, setId), setsWithin(grant)))
    .orderBy(desc(sets.checkedInAt));
  const visits = new Map<string, EarlierVisit[]>();
  for (const { injectorId, ...visit } of rows)
    visits.set(injectorId, [...(visits.get(injectorId) ?? []), visit]);
  return visits;
}
