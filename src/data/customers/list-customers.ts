import "server-only";
import { and, asc, count, inArray, ne, sql } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { customers } from "../../db/schema/customers";
import { sets } from "../../db/schema/sets";
import type { Context } from "../access/actor";
import { containing } from "../containing";
import { pageOf } from "../page-of";
import { read } from "../read";
import { listCustomersInput } from "./inputs";
import { customerName, customersWithin } from "./internal";
import type { CustomerRow } from "./types";

/** A page of customers by name. Contact data are null for technicians. */
export function listCustomers(context: Context, raw: unknown) {
  return read(context, "listCustomers", listCustomersInput, raw, async ({ connection, input, grant }) => {
    const { offset, limit } = pageOf(input);
    const where = and(
      input.search ? containing(customerName, input.search) : undefined,
      customersWithin(grant),
    );
    const found = await connection
      .select({
        customerId: customers.id,
        name: customers.name,
        contactName: customers.contactName,
        phone: customers.phone,
      })
      .from(customers)
      .where(where)
      .orderBy(asc(customerName), asc(customers.id))
      .limit(limit)
      .offset(offset);
    const [all] = await connection.select({ total: count() }).from(customers).where(where);
    const counted = await countSets(
      connection,
      found.map((row) => row.customerId),
    );
    const rows: CustomerRow[] = found.map((row) => ({
      ...row,
      ...(grant.right === "name only" ? { contactName: null, phone: null } : {}),
      ...(counted.get(row.customerId) ?? { sets: 0, setsHere: 0, lastCheckIn: null }),
    }));
    return { rows, total: all!.total };
  });
}

async function countSets(connection: Connection, customerIds: string[]) {
  if (customerIds.length === 0) return new Map<string, never>();
  const rows = await connection
    .select({
      customerId: sets.customerId,
      sets: count(),
      setsHere: sql<number>`count(*) filter (where ${ne(sets.stage, "handed over")})::int`,
      lastCheckIn: sql<string>`max(${sets.checkedInAt})`,
    })
    .from(sets)
    .where(inArray(sets.customerId, customerIds))
    .groupBy(sets.customerId);
  return new Map(
    rows.map(({ customerId, lastCheckIn, ...row }) => [
      customerId,
      { ...row, lastCheckIn: new Date(lastCheckIn) },
    ]),
  );
}
