import "server-only";
import { brokenConstraint } from "../../db/lost-connection";
import { toleranceClasses } from "../../db/schema/tolerance-classes";
import type { Context } from "../access/actor";
import { invalid } from "../access/errors";
import { write } from "../write";
import { addToleranceClassInput } from "./inputs";
import { insertRevision } from "./internal";

export function addToleranceClass(context: Context, raw: unknown) {
  return write(
    context,
    "addToleranceClass",
    addToleranceClassInput,
    raw,
    async ({ transaction, input, record }) => {
      const { idempotencyKey: _key, name, ...limits } = input;
      const [added] = await transaction
        .insert(toleranceClasses)
        .values({ name })
        .returning({ toleranceClassId: toleranceClasses.id })
        .catch((error: unknown) => {
          if (brokenConstraint(error) === "tolerance_classes_one_per_name")
            throw invalid("name", `There is already a class named ${name}.`);
          throw error;
        });
      const { toleranceClassId } = added!;
      await insertRevision(transaction, context, { toleranceClassId, revision: 1 }, limits);
      await record({
        event: "tolerance class added",
        noun: "tolerance class",
        objectId: toleranceClassId,
        after: { name, ...limits },
      });
      return { toleranceClassId };
    },
  );
}
