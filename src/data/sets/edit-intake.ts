import "server-only";
import { eq } from "drizzle-orm";
import { sets } from "../../db/schema/sets";
import type { Context } from "../access/actor";
import { lockSet, requireOpenStage } from "../course";
import { requireSameVersion } from "../require-same-version";
import { write } from "../write";
import { changeInjectors } from "./change-injectors";
import { editIntakeInput } from "./inputs";
import { intakeLabels, intakeOnRecord, intakeTyped } from "./intake-texts";
import { requireChangeable } from "./require-changeable";
import { requireModel, requirePromise, requireUsableClass } from "./require-intake";

/** What was written down at the counter, changed: freely before the first cycle, later by the manager with a reason. */
export function editIntake(context: Context, raw: unknown) {
  return write(context, "editIntake", editIntakeInput, raw, async ({ transaction, input, record }) => {
    const set = await lockSet(transaction, input.setId);
    requireOpenStage(set);
    await requireChangeable(transaction, context, set, input.reason);
    const before = await intakeOnRecord(transaction, set);
    const after = await intakeTyped(transaction, input);
    requireSameVersion({
      stored: { ...before, version: set.version },
      version: input.version,
      values: after,
      labels: intakeLabels(input.injectors.length),
    });
    await requireModel(transaction, input.modelId);
    if (input.promisedOn !== set.promisedOn) await requirePromise(transaction, input.promisedOn);
    if (input.toleranceClassId !== set.toleranceClassId)
      await requireUsableClass(transaction, input.toleranceClassId);
    await transaction
      .update(sets)
      .set({
        injectorModelId: input.modelId,
        toleranceClassId: input.toleranceClassId,
        workAsked: input.workAsked,
        promisedOn: input.promisedOn,
        customerRequest: input.customerRequest,
        internalNote: input.internalNote,
        version: set.version + 1,
      })
      .where(eq(sets.id, set.setId));
    await changeInjectors(transaction, context, set, input);
    await record({
      event: "intake changed",
      noun: "set",
      objectId: set.setId,
      setId: set.setId,
      ...differences(before, after),
      ...(input.reason ? { reason: input.reason } : {}),
    });
    return { setId: set.setId };
  });
}

function differences(before: Record<string, string>, after: Record<string, string>) {
  const fields = Object.keys(after).filter((field) => before[field] !== after[field]);
  const pick = (from: Record<string, string>) =>
    Object.fromEntries(fields.map((field) => [field, from[field] ?? ""]));
  return { before: pick(before), after: pick(after) };
}
