import "server-only";
import { and, asc, sql } from "drizzle-orm";
import { customers } from "../../db/schema/customers";
import type { Context } from "../access/actor";
import { containing } from "../containing";
import { read } from "../read";
import { findCustomersInput } from "./inputs";
import { customerName, customersWithin } from "./internal";

const most = 12;

/** Search as you type: names that begin with what was typed come first. A technician sees the names alone. */
export function findCustomers(context: Context, raw: unknown) {
  return read(context, "findCustomers", findCustomersInput, raw, async ({ connection, input, grant }) => {
    const found = await connection
      .select({ customerId: customers.id, name: customers.name, contactName: customers.contactName })
      .from(customers)
      .where(and(containing(customerName, input.search), customersWithin(grant)))
      .orderBy(
        sql`position(${input.search.toLowerCase()} in ${customerName})`,
        asc(customerName),
        asc(customers.id),
      )
      .limit(most);
    return found.map((row) => (grant.right === "name only" ? { ...row, contactName: "" } : row));
  });
}
