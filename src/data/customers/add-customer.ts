import "server-only";
import type { Context } from "../access/actor";
import { write } from "../write";
import { addCustomerInput } from "./inputs";
import { insertCustomer } from "./internal";

export function addCustomer(context: Context, raw: unknown) {
  return write(context, "addCustomer", addCustomerInput, raw, async ({ transaction, input, record }) => {
    const { idempotencyKey: _key, ...values } = input;
    const customerId = await insertCustomer(transaction, values);
    await record({ event: "customer added", noun: "customer", objectId: customerId });
    return { customerId };
  });
}
