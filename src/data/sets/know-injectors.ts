import "server-only";
import { sql } from "drizzle-orm";
import type { Connection, Transaction } from "../../db/client";
import { injectors } from "../../db/schema/injectors";

type Serials = (string | null)[];

/**
 * The injectors themselves, one for each place: a serial that is on record is the same injector again, another one is new.
 * Inserted in one order by everybody, so that two check-ins cannot wait for each other.
 */
export async function knowInjectors(
  transaction: Transaction,
  modelId: string,
  serials: Serials,
): Promise<string[]> {
  const named = serials.filter((serial) => serial !== null).sort();
  if (named.length > 0)
    await transaction
      .insert(injectors)
      .values(named.map((serial) => ({ injectorModelId: modelId, serial })))
      .onConflictDoNothing();
  const known = await injectorsBySerial(transaction, modelId, serials);
  const nameless = serials.filter((serial) => serial === null);
  const added =
    nameless.length > 0
      ? await transaction
          .insert(injectors)
          .values(nameless.map(() => ({ injectorModelId: modelId })))
          .returning({ id: injectors.id })
      : [];
  return serials.map((serial, at) => (serial === null ? added.pop()!.id : known.get(at)!));
}

/** Injectors on record, by the place of their serial in the list. */
export async function injectorsBySerial(
  connection: Connection,
  modelId: string,
  serials: Serials,
): Promise<Map<number, string>> {
  if (serials.length === 0) return new Map();
  const rows = await connection.execute<{ place: number; injector_id: string }>(sql`
    select typed.place::int as place, injectors.injector_id
    from unnest(${sql.param(serials)}::text[]) with ordinality as typed (serial, place)
    join injectors on injectors.injector_model_id = ${modelId} and upper(injectors.serial) = upper(typed.serial)`);
  return new Map(rows.map((row) => [row.place - 1, row.injector_id]));
}
