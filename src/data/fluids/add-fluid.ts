import "server-only";
import { brokenConstraint } from "../../db/lost-connection";
import { fluids } from "../../db/schema/fluids";
import type { Context } from "../access/actor";
import { invalid } from "../access/errors";
import { write } from "../write";
import { addFluidInput } from "./inputs";

/** Figures already recorded rest on a fluid's density, so a fluid is added or retired and never edited. */
export function addFluid(context: Context, raw: unknown) {
  return write(context, "addFluid", addFluidInput, raw, async ({ transaction, input, record }) => {
    const { idempotencyKey: _key, ...values } = input;
    const [added] = await transaction
      .insert(fluids)
      .values(values)
      .returning({ fluidId: fluids.id })
      .catch((error: unknown) => {
        if (brokenConstraint(error) === "fluids_one_per_name")
          throw invalid("name", `There is already a fluid named ${values.name}.`);
        throw error;
      });
    await record({ event: "fluid added", noun: "fluid", objectId: added!.fluidId, after: values });
    return added!;
  });
}
