import "server-only";
import { and, eq, inArray, ne } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { setInjectors } from "../../db/schema/injectors";
import { sets } from "../../db/schema/sets";
import { Refusal } from "../access/errors";

export type Wanted = { injectorId: string; serial: string | null; field: string };

/** Refuses injectors that have not left the lab since another visit, each beside its serial. */
export async function refuseStillInASet(
  transaction: Transaction,
  setId: string,
  wanted: Wanted[],
): Promise<void> {
  if (wanted.length === 0) return;
  const elsewhere = await transaction
    .select({ injectorId: setInjectors.injectorId, number: sets.number, stage: sets.stage })
    .from(setInjectors)
    .innerJoin(sets, eq(sets.id, setInjectors.setId))
    .where(
      and(
        eq(setInjectors.inHouse, true),
        ne(setInjectors.setId, setId),
        inArray(
          setInjectors.injectorId,
          wanted.map(({ injectorId }) => injectorId),
        ),
      ),
    );
  if (elsewhere.length === 0) return;
  const fields: Record<string, string[]> = {};
  for (const { injectorId, serial, field } of wanted) {
    const held = elsewhere.find((row) => row.injectorId === injectorId);
    if (held) fields[field] = [`${serial} is still here in set ${held.number}, which is ${held.stage}.`];
  }
  throw new Refusal("invalid", "Some injectors have not left the lab since their last visit.", { fields });
}
