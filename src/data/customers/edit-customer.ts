import "server-only";
import { eq } from "drizzle-orm";
import { customers } from "../../db/schema/customers";
import type { Context } from "../access/actor";
import { notFound } from "../access/errors";
import { requireSameVersion } from "../require-same-version";
import { write } from "../write";
import { editCustomerInput } from "./inputs";

const labels = {
  name: "Customer's name",
  contactName: "Contact",
  email: "E-mail",
  phone: "Phone",
  address: "Address",
  internalNote: "Internal note",
};

export function editCustomer(context: Context, raw: unknown) {
  return write(context, "editCustomer", editCustomerInput, raw, async ({ transaction, input, record }) => {
    const { idempotencyKey: _key, customerId, version, ...values } = input;
    const [stored] = await transaction
      .select()
      .from(customers)
      .where(eq(customers.id, customerId))
      .for("update");
    if (!stored) throw notFound("customer");
    requireSameVersion({ stored, version, values, labels });
    await transaction
      .update(customers)
      .set({ ...values, version: version + 1 })
      .where(eq(customers.id, customerId));
    // Contact data stays out of the activity record, so that it can be erased.
    const changed = Object.keys(values).filter(
      (field) => stored[field as keyof typeof stored] !== values[field as keyof typeof values],
    );
    await record({ event: "customer changed", noun: "customer", objectId: customerId, after: { changed } });
    return { customerId };
  });
}
