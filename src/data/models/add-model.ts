import "server-only";
import type { Context } from "../access/actor";
import { write } from "../write";
import { addModelInput } from "./inputs";
import { insertModel } from "./internal";

export function addModel(context: Context, raw: unknown) {
  return write(context, "addModel", addModelInput, raw, async ({ transaction, input, record }) => {
    const { idempotencyKey: _key, ...values } = input;
    const modelId = await insertModel(transaction, values, { confirmed: true });
    await record({ event: "model added", noun: "model", objectId: modelId, after: values });
    return { modelId };
  });
}
