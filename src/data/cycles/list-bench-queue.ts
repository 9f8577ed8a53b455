import "server-only";
import { and, asc, eq, inArray, isNull, sql } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { customers } from "../../db/schema/customers";
import { cycleDrafts } from "../../db/schema/cycles";
import { setInjectors } from "../../db/schema/injectors";
import { injectorModels } from "../../db/schema/models";
import { people } from "../../db/schema/people";
import { setHolds, sets } from "../../db/schema/sets";
import type { Stage } from "../../db/vocabulary";
import type { Context } from "../access/actor";
import { noInput } from "../fields";
import { read } from "../read";
import { loadBenches } from "./load-benches";

const onTheBench: Stage[] = ["checked in", "as found", "cleaning", "as left"];

/** What is next at the bench: the earliest promise first, held sets last, each with its open sheets. */
export function listBenchQueue(context: Context, raw?: unknown) {
  return read(context, "listBenchQueue", noInput, raw, async ({ connection }) => {
    const [waiting, benches] = await Promise.all([selectWaiting(connection), loadBenches(connection)]);
    const drafts = await selectDrafts(
      connection,
      waiting.map((set) => set.setId),
    );
    return {
      sets: waiting.map((set) => ({ ...set, drafts: drafts.filter((draft) => draft.setId === set.setId) })),
      benches,
    };
  });
}

function selectWaiting(connection: Connection) {
  return connection
    .select({
      setId: sets.id,
      number: sets.number,
      stage: sets.stage,
      promisedOn: sets.promisedOn,
      workAsked: sets.workAsked,
      customerName: customers.name,
      modelName: sql<string>`${injectorModels.make} || ' ' || ${injectorModels.partNumber}`,
      injectorCount: sql<number>`(select count(*)::int from ${setInjectors}
        where ${setInjectors.setId} = ${sets.id} and ${setInjectors.state} = 'in set')`,
      holdReason: setHolds.reason,
    })
    .from(sets)
    .innerJoin(customers, eq(customers.id, sets.customerId))
    .innerJoin(injectorModels, eq(injectorModels.id, sets.injectorModelId))
    .leftJoin(setHolds, and(eq(setHolds.setId, sets.id), isNull(setHolds.clearedAt)))
    .where(inArray(sets.stage, onTheBench))
    .orderBy(sql`${setHolds.reason} is not null`, asc(sets.promisedOn), asc(sets.number))
    .limit(500);
}

function selectDrafts(connection: Connection, setIds: string[]) {
  if (setIds.length === 0) return [];
  return connection
    .select({
      draftId: cycleDrafts.id,
      setId: cycleDrafts.setId,
      phase: cycleDrafts.phase,
      corrects: sql<boolean>`${cycleDrafts.correctsCycleId} is not null`,
      savedBy: people.name,
      savedAt: cycleDrafts.savedAt,
    })
    .from(cycleDrafts)
    .innerJoin(people, eq(people.id, cycleDrafts.savedBy))
    .where(and(inArray(cycleDrafts.setId, setIds), isNull(cycleDrafts.closedAt)));
}
