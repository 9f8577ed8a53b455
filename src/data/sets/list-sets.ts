import "server-only";
import { and, asc, count, desc, eq, inArray, isNull, sql } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { certificates } from "../../db/schema/certificates";
import { customers } from "../../db/schema/customers";
import { setInjectors } from "../../db/schema/injectors";
import { labDetails } from "../../db/schema/lab";
import { injectorModels } from "../../db/schema/models";
import { setHolds, sets } from "../../db/schema/sets";
import { stages } from "../../db/vocabulary";
import type { Context } from "../access/actor";
import { customerName } from "../customers";
import { railStripsOfSets } from "../cycles";
import { modelName } from "../models";
import { pageOf } from "../page-of";
import { read } from "../read";
import { listSetsInput } from "./inputs";
import { daysLate } from "./internal";
import { matchingSets } from "./matching-sets";
import type { SetRow } from "./types";

const sortColumns = {
  number: sql`${sets.number}`,
  customer: customerName,
  model: modelName,
  stage: sql`array_position(array[${sql.join(
    stages.map((stage) => sql`${stage}`),
    sql`, `,
  )}], ${sets.stage})`,
  promisedOn: sql`${sets.promisedOn}`,
  checkedInAt: sql`${sets.checkedInAt}`,
};

/** A page of sets with what a list shows of each; at most a hundred at once. */
export function listSets(context: Context, raw: unknown): Promise<{ rows: SetRow[]; total: number }> {
  return read(context, "listSets", listSetsInput, raw, async ({ connection, input, grant }) => {
    const { offset, limit } = pageOf(input);
    const where = matchingSets(input, grant);
    const direction = input.descending ? desc : asc;
    const found = await selectRows(connection)
      .where(where)
      .orderBy(direction(sortColumns[input.sort]), direction(sets.id))
      .limit(limit)
      .offset(offset);
    const [all] = await connection
      .select({ total: count() })
      .from(sets)
      .innerJoin(labDetails, eq(labDetails.id, 1))
      .where(where);
    const setIds = found.map(({ setId }) => setId);
    const [injectors, rails] = await Promise.all([
      countInjectors(connection, setIds),
      railStripsOfSets(connection, grant.customerIds ? await certifiedAmong(connection, setIds) : setIds),
    ]);
    return {
      rows: found.map((row) => ({
        ...row,
        injectors: injectors.get(row.setId) ?? 0,
        rail: rails.get(row.setId) ?? null,
      })),
      total: all!.total,
    };
  });
}

function selectRows(connection: Connection) {
  return connection
    .select({
      setId: sets.id,
      number: sets.number,
      customerId: customers.id,
      customer: customers.name,
      model: sql<string>`${injectorModels.make} || ' ' || ${injectorModels.partNumber}`,
      stage: sets.stage,
      hold: setHolds.reason,
      promisedOn: sets.promisedOn,
      daysLate,
      checkedInAt: sets.checkedInAt,
    })
    .from(sets)
    .innerJoin(customers, eq(customers.id, sets.customerId))
    .innerJoin(injectorModels, eq(injectorModels.id, sets.injectorModelId))
    .innerJoin(labDetails, eq(labDetails.id, 1))
    .leftJoin(setHolds, and(eq(setHolds.setId, sets.id), isNull(setHolds.clearedAt)));
}

/** A customer sees what was measured once it is certified. */
async function certifiedAmong(connection: Connection, setIds: string[]): Promise<string[]> {
  const rows = await connection
    .selectDistinct({ setId: certificates.setId })
    .from(certificates)
    .where(inArray(certificates.setId, setIds));
  return rows.map(({ setId }) => setId);
}

async function countInjectors(connection: Connection, setIds: string[]): Promise<Map<string, number>> {
  if (setIds.length === 0) return new Map();
  const rows = await connection
    .select({ setId: setInjectors.setId, injectors: count() })
    .from(setInjectors)
    .where(and(inArray(setInjectors.setId, setIds), eq(setInjectors.state, "in set")))
    .groupBy(setInjectors.setId);
  return new Map(rows.map(({ setId, injectors }) => [setId, injectors]));
}
