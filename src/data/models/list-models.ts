import "server-only";
import { and, asc, count, isNull } from "drizzle-orm";
import { injectorModels } from "../../db/schema/models";
import type { Context } from "../access/actor";
import { containing } from "../containing";
import { pageOf } from "../page-of";
import { read } from "../read";
import { listModelsInput } from "./inputs";
import { modelColumns, modelName } from "./internal";

/** A page of models by make and part number. */
export function listModels(context: Context, raw: unknown) {
  return read(context, "listModels", listModelsInput, raw, async ({ connection, input }) => {
    const { offset, limit } = pageOf(input);
    const where = and(
      input.search ? containing(modelName, input.search) : undefined,
      input.unconfirmed ? isNull(injectorModels.confirmedAt) : undefined,
    );
    const [rows, [all]] = await Promise.all([
      connection
        .select({ ...modelColumns, version: injectorModels.version })
        .from(injectorModels)
        .where(where)
        .orderBy(asc(modelName), asc(injectorModels.id))
        .limit(limit)
        .offset(offset),
      connection.select({ total: count() }).from(injectorModels).where(where),
    ]);
    return { rows, total: all!.total };
  });
}
