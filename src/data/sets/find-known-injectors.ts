import "server-only";
import { desc, eq, inArray } from "drizzle-orm";
import { setInjectors } from "../../db/schema/injectors";
import { sets } from "../../db/schema/sets";
import type { Context } from "../access/actor";
import { read } from "../read";
import { findKnownInjectorsInput } from "./inputs";
import { injectorsBySerial } from "./know-injectors";
import type { KnownInjector } from "./types";

/** What is known of serials while they are typed: their earlier visits, and the set they have not left yet. */
export function findKnownInjectors(context: Context, raw: unknown): Promise<KnownInjector[]> {
  return read(context, "findKnownInjectors", findKnownInjectorsInput, raw, async ({ connection, input }) => {
    const known = await injectorsBySerial(connection, input.modelId, input.serials);
    if (known.size === 0) return [];
    const visits = await connection
      .select({
        injectorId: setInjectors.injectorId,
        here: setInjectors.inHouse,
        setId: sets.id,
        number: sets.number,
        checkedInAt: sets.checkedInAt,
      })
      .from(setInjectors)
      .innerJoin(sets, eq(sets.id, setInjectors.setId))
      .where(inArray(setInjectors.injectorId, [...known.values()]))
      .orderBy(desc(sets.checkedInAt));
    return [...known].map(([place, injectorId]) => {
      const own = visits.filter((visit) => visit.injectorId === injectorId);
      return {
        serial: input.serials[place]!,
        injectorId,
        openSet: own.find((visit) => visit.here)?.number ?? null,
        visits: own.map(({ setId, number, checkedInAt }) => ({ setId, number, checkedInAt })),
      };
    });
  });
}
