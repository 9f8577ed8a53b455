import "server-only";
import { asc, sql } from "drizzle-orm";
import { customers } from "../../db/schema/customers";
import type { Context } from "../access/actor";
import { containing } from "../containing";
import { read } from "../read";
import { findCustomersInput } from "./inputs";

const most = 12;

/** Search as you type: the nearest names first. */
export function findCustomers(context: Context, raw: unknown) {
  return read(context, "findCustomers", findCustomersInput, raw, async ({ connection, input }) => {
    const name = sql`lower(${customers.name})`;
    return connection
      .select({ customerId: customers.id, name: customers.name })
      .from(customers)
      .where(containing(name, input.search))
      .orderBy(sql`position(${input.search.toLowerCase()} in ${name})`, asc(name), asc(customers.id))
      .limit(most);
  });
}
