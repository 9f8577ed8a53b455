import "server-only";
import { inArray, type SQL, sql } from "drizzle-orm";
import type { z } from "zod";
import type { Transaction } from "../../db/client";
import { customers } from "../../db/schema/customers";
import type { Grant } from "../access/authorize";
import type { customerFields } from "./inputs";

export const customerName = sql`lower(${customers.name})`;

/** The customers that the actor reaches: all, or those acted for. */
export function customersWithin(grant: Grant): SQL | undefined {
  return grant.customerIds ? inArray(customers.id, [...grant.customerIds]) : undefined;
}

type CustomerValues = { [Field in keyof typeof customerFields]: z.output<(typeof customerFields)[Field]> };

/** Adds a customer within another verb's transaction too: check-in enters new customers on the spot. */
export async function insertCustomer(transaction: Transaction, values: CustomerValues): Promise<string> {
  const [added] = await transaction.insert(customers).values(values).returning({ id: customers.id });
  return added!.id;
}
