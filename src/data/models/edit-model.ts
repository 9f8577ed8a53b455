import "server-only";
import { eq } from "drizzle-orm";
import { recordNow } from "../../db/columns";
import { injectorModels } from "../../db/schema/models";
import type { Context } from "../access/actor";
import { notFound } from "../access/errors";
import { requireSameVersion } from "../require-same-version";
import { write } from "../write";
import { modelChanges } from "./changes";
import { editModelInput, modelLabels } from "./inputs";
import { refuseSecondOfName } from "./internal";

/** Saving a model that was entered at the counter confirms it. */
export function editModel(context: Context, raw: unknown) {
  return write(context, "editModel", editModelInput, raw, async ({ transaction, input, record }) => {
    const { idempotencyKey: _key, modelId, version, ...values } = input;
    const [stored] = await transaction
      .select()
      .from(injectorModels)
      .where(eq(injectorModels.id, modelId))
      .for("update");
    if (!stored) throw notFound("model");
    requireSameVersion({ stored, version, values, labels: modelLabels });
    await transaction
      .update(injectorModels)
      .set({ ...values, version: version + 1, confirmedAt: stored.confirmedAt ?? recordNow })
      .where(eq(injectorModels.id, modelId))
      .catch(refuseSecondOfName(values));
    await record({
      event: "model changed",
      noun: "model",
      objectId: modelId,
      ...modelChanges(stored, values),
      ...(stored.confirmedAt ? {} : { reason: "confirmed" }),
    });
    return { modelId };
  });
}
