import "server-only";
import { count, eq } from "drizzle-orm";
import { injectorModels } from "../../db/schema/models";
import { sets } from "../../db/schema/sets";
import type { Context } from "../access/actor";
import { notFound } from "../access/errors";
import { read } from "../read";
import { getModelInput } from "./inputs";
import { modelColumns } from "./internal";

export function getModel(context: Context, raw: unknown) {
  return read(context, "getModel", getModelInput, raw, async ({ connection, input }) => {
    const [model] = await connection
      .select({ ...modelColumns, version: injectorModels.version, createdAt: injectorModels.createdAt })
      .from(injectorModels)
      .where(eq(injectorModels.id, input.modelId));
    if (!model) throw notFound("model");
    const [used] = await connection
      .select({ sets: count() })
      .from(sets)
      .where(eq(sets.injectorModelId, input.modelId));
    return { ...model, sets: used!.sets };
  });
}
