import "server-only";
import { eq, sql } from "drizzle-orm";
import type { z } from "zod";
import type { Transaction } from "../../db/client";
import { customers } from "../../db/schema/customers";
import { labDetails } from "../../db/schema/lab";
import { injectorModels } from "../../db/schema/models";
import { toleranceClasses } from "../../db/schema/tolerance-classes";
import { invalid } from "../access/errors";
import { insertCustomer } from "../customers";
import { insertModel } from "../models";
import type { checkInSetInput } from "./inputs";
import { labToday } from "./internal";

type CheckIn = z.output<typeof checkInSetInput>;

/** The lab's own day counts, not the browser's. */
export async function requirePromise(transaction: Transaction, promisedOn: string): Promise<void> {
  const [lab] = await transaction.select({ today: sql<string>`${labToday}::text` }).from(labDetails);
  if (lab && promisedOn < lab.today)
    throw invalid("promisedOn", `Promised day is not before today, ${lab.today} in the lab.`);
}

export async function requireUsableClass(transaction: Transaction, toleranceClassId: string): Promise<void> {
  const [found] = await transaction
    .select({ name: toleranceClasses.name, retiredAt: toleranceClasses.retiredAt })
    .from(toleranceClasses)
    .where(eq(toleranceClasses.id, toleranceClassId));
  if (!found) throw invalid("toleranceClassId", "There is no such tolerance class.");
  if (found.retiredAt)
    throw invalid("toleranceClassId", `${found.name} is retired. Please choose another class.`);
}

export async function resolveCustomer(
  transaction: Transaction,
  customer: CheckIn["customer"],
): Promise<string> {
  if (customer.is === "new") {
    const { is: _is, ...values } = customer;
    return insertCustomer(transaction, values);
  }
  const [found] = await transaction
    .select({ id: customers.id })
    .from(customers)
    .where(eq(customers.id, customer.customerId));
  if (!found) throw invalid("customer.customerId", "There is no such customer.");
  return found.id;
}

export async function resolveModel(transaction: Transaction, model: CheckIn["model"]): Promise<string> {
  if (model.is === "new") {
    const { is: _is, ...values } = model;
    return insertModel(transaction, values, { confirmed: false, prefix: "model." });
  }
  return requireModel(transaction, model.modelId, "model.modelId");
}

export async function requireModel(
  transaction: Transaction,
  modelId: string,
  field = "modelId",
): Promise<string> {
  const [found] = await transaction
    .select({ id: injectorModels.id })
    .from(injectorModels)
    .where(eq(injectorModels.id, modelId));
  if (!found) throw invalid(field, "There is no such injector model.");
  return found.id;
}
