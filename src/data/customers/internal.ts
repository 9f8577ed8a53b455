import "server-only";
import type { z } from "zod";
import type { Transaction } from "../../db/client";
import { customers } from "../../db/schema/customers";
import type { customerFields } from "./inputs";

type CustomerValues = { [Field in keyof typeof customerFields]: z.output<(typeof customerFields)[Field]> };

/** Adds a customer within another verb's transaction too: check-in enters new customers on the spot. */
export async function insertCustomer(transaction: Transaction, values: CustomerValues): Promise<string> {
  const [added] = await transaction.insert(customers).values(values).returning({ id: customers.id });
  return added!.id;
}
