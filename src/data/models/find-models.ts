import "server-only";
import { asc, sql } from "drizzle-orm";
import { injectorModels } from "../../db/schema/models";
import type { Context } from "../access/actor";
import { containing } from "../containing";
import { read } from "../read";
import { findModelsInput } from "./inputs";
import { modelColumns, modelName } from "./internal";

const most = 12;

/** Search as you type: names that begin with what was typed come first. */
export function findModels(context: Context, raw: unknown) {
  return read(context, "findModels", findModelsInput, raw, ({ connection, input }) =>
    connection
      .select(modelColumns)
      .from(injectorModels)
      .where(containing(modelName, input.search))
      .orderBy(
        sql`position(${input.search.toLowerCase()} in ${modelName})`,
        asc(modelName),
        asc(injectorModels.id),
      )
      .limit(most),
  );
}
