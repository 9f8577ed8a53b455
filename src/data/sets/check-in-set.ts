import "server-only";
import type { z } from "zod";
import type { Transaction } from "../../db/client";
import { sets } from "../../db/schema/sets";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { beginCourse } from "../course";
import { takeNumber } from "../take-number";
import { write } from "../write";
import { checkInSetInput } from "./inputs";
import { knowInjectors } from "./know-injectors";
import { requirePromise, requireUsableClass, resolveCustomer, resolveModel } from "./require-intake";
import { takePlaces } from "./take-places";

/** A parcel becomes a set: its number, its tags and the first step of its course, all or nothing. */
export function checkInSet(context: Context, raw: unknown) {
  return write(context, "checkInSet", checkInSetInput, raw, async ({ transaction, input, record }) => {
    await requirePromise(transaction, input.promisedOn);
    await requireUsableClass(transaction, input.toleranceClassId);
    const customerId = await resolveCustomer(transaction, input.customer);
    const modelId = await resolveModel(transaction, input.model);
    const known = await knowInjectors(
      transaction,
      modelId,
      input.injectors.map(({ serial }) => serial),
    );
    const { setId, number } = await insertSet(transaction, context, { ...input, customerId, modelId });
    await takePlaces(
      transaction,
      { setId, number },
      input.injectors.map((injector, at) => ({
        ...injector,
        injectorId: known[at]!,
        position: at + 1,
        field: `injectors[${at}].serial`,
      })),
    );
    await beginCourse(transaction, context, setId);
    await record({
      event: "set checked in",
      noun: "set",
      objectId: setId,
      setId,
      after: {
        number,
        customerId,
        customer: input.customer.is,
        modelId,
        model: input.model.is,
        injectors: input.injectors.length,
        promisedOn: input.promisedOn,
      },
    });
    return { setId, number };
  });
}

type NewSet = Pick<
  z.output<typeof checkInSetInput>,
  "toleranceClassId" | "workAsked" | "customerRequest" | "internalNote" | "promisedOn"
> & { customerId: string; modelId: string };

async function insertSet(transaction: Transaction, context: Context, values: NewSet) {
  const number = await takeNumber(transaction, "set");
  const [set] = await transaction
    .insert(sets)
    .values({
      number,
      customerId: values.customerId,
      injectorModelId: values.modelId,
      toleranceClassId: values.toleranceClassId,
      workAsked: values.workAsked,
      customerRequest: values.customerRequest,
      internalNote: values.internalNote,
      promisedOn: values.promisedOn,
      checkedInBy: requirePerson(context).personId,
    })
    .returning({ setId: sets.id });
  return { setId: set!.setId, number };
}
