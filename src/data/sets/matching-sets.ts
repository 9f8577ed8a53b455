import "server-only";
import { and, eq, type SQL, sql } from "drizzle-orm";
import type { z } from "zod";
import { customers } from "../../db/schema/customers";
import { injectors, setInjectors } from "../../db/schema/injectors";
import { injectorModels } from "../../db/schema/models";
import { setHolds, sets } from "../../db/schema/sets";
import type { Grant } from "../access/authorize";
import { containing } from "../containing";
import { customerName } from "../customers";
import { modelName } from "../models";
import type { listSetsInput } from "./inputs";
import { isLate, setsWithin } from "./internal";

type Asked = z.output<typeof listSetsInput>;

/** What a list of sets asks for, within the rows that the actor reaches. */
export function matchingSets(asked: Asked, grant: Grant): SQL | undefined {
  return and(
    setsWithin(grant),
    inView(asked.view),
    asked.stage ? eq(sets.stage, asked.stage) : undefined,
    asked.customerId ? eq(sets.customerId, asked.customerId) : undefined,
    containingText(asked.search),
  );
}

const held = sql`exists (
  select from ${setHolds} where ${setHolds.setId} = ${sets.id} and ${setHolds.clearedAt} is null)`;

function inView(view: Asked["view"]): SQL | undefined {
  switch (view) {
    case "in the lab":
      return sql`${sets.stage} <> 'handed over'`;
    case "late":
      return isLate;
    case "on hold":
      return held;
    case "ready to leave":
      return sql`${sets.stage} in ('certified', 'returned uncleaned')`;
    case "handed over":
      return eq(sets.stage, "handed over");
    case "all":
      return undefined;
  }
}

/** Each source is searched by its own index; a tag is found by the number it begins with. */
function containingText(typed: string): SQL | undefined {
  if (typed === "") return undefined;
  const number = typed.split("/")[0]!;
  return sql`${sets.id} in (
    select ${sets.id} from ${sets} where ${containing(sql`${sets.number}`, number)}
    union
    select ${sets.id} from ${sets} join ${customers} on ${customers.id} = ${sets.customerId}
      where ${containing(customerName, typed)}
    union
    select ${sets.id} from ${sets} join ${injectorModels} on ${injectorModels.id} = ${sets.injectorModelId}
      where ${containing(modelName, typed)}
    union
    select ${setInjectors.setId} from ${setInjectors}
      join ${injectors} on ${injectors.id} = ${setInjectors.injectorId}
      where ${containing(sql`lower(${injectors.serial})`, typed)})`;
}
