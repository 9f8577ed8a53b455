import "server-only";
import { and, asc, eq } from "drizzle-orm";
import { customers } from "../../db/schema/customers";
import { customerPeople, people } from "../../db/schema/people";
import type { Context } from "../access/actor";
import { notFound } from "../access/errors";
import { read } from "../read";
import { getCustomerInput } from "./inputs";
import { customersWithin } from "./internal";
import type { CustomerDetail } from "./types";

export function getCustomer(context: Context, raw: unknown): Promise<CustomerDetail> {
  return read(context, "getCustomer", getCustomerInput, raw, async ({ connection, input, grant }) => {
    const [found] = await connection
      .select({
        customerId: customers.id,
        name: customers.name,
        version: customers.version,
        contact: {
          contactName: customers.contactName,
          email: customers.email,
          phone: customers.phone,
          address: customers.address,
        },
        internalNote: customers.internalNote,
        since: customers.createdAt,
      })
      .from(customers)
      .where(and(eq(customers.id, input.customerId), customersWithin(grant)));
    if (!found) throw notFound("customer");
    const acting = await connection
      .select({ personId: people.id, name: people.name, active: people.active })
      .from(customerPeople)
      .innerJoin(people, eq(people.id, customerPeople.personId))
      .where(eq(customerPeople.customerId, input.customerId))
      .orderBy(asc(people.name));
    const nameOnly = grant.right === "name only";
    return {
      ...found,
      contact: nameOnly ? null : found.contact,
      internalNote: grant.right === "yes" ? found.internalNote : null,
      people: nameOnly ? [] : acting,
    };
  });
}
