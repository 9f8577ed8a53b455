import "server-only";
import { and, asc, count, desc, eq, or, type SQL, sql } from "drizzle-orm";
import { certificates } from "../../db/schema/certificates";
import { customers } from "../../db/schema/customers";
import { injectorModels } from "../../db/schema/models";
import { people } from "../../db/schema/people";
import { sets } from "../../db/schema/sets";
import type { CertificateState } from "../../db/vocabulary";
import type { Context } from "../access/actor";
import { containing } from "../containing";
import { pageOf } from "../page-of";
import { read } from "../read";
import { listCertificatesInput } from "./inputs";
import { reachableBy, replacedByNumber } from "./internal";

export type CertificateRow = {
  certificateId: string;
  number: string;
  state: CertificateState;
  issuedAt: Date;
  releasedBy: string;
  setId: string;
  setNumber: string;
  customer: string;
  model: string;
  replacedBy: string | null;
};

const sortColumns = {
  issuedAt: certificates.issuedAt,
  number: certificates.number,
  set: sets.number,
  customer: sql`lower(${customers.name})`,
};

/** A page of certificates, newest first unless asked otherwise. */
export function listCertificates(context: Context, raw: unknown) {
  return read(
    context,
    "listCertificates",
    listCertificatesInput,
    raw,
    async ({ connection, input, grant }) => {
      const { offset, limit } = pageOf(input);
      const where = and(
        reachableBy(grant),
        input.setId ? eq(certificates.setId, input.setId) : undefined,
        input.state ? eq(certificates.state, input.state) : undefined,
        matching(input.search),
      );
      const direction = input.descending ? desc : asc;
      const rows: CertificateRow[] = await connection
        .select({
          certificateId: certificates.id,
          number: certificates.number,
          state: certificates.state,
          issuedAt: certificates.issuedAt,
          releasedBy: people.name,
          setId: sets.id,
          setNumber: sets.number,
          customer: customers.name,
          model: sql<string>`${injectorModels.make} || ' ' || ${injectorModels.partNumber}`,
          replacedBy: replacedByNumber,
        })
        .from(certificates)
        .innerJoin(sets, eq(sets.id, certificates.setId))
        .innerJoin(customers, eq(customers.id, sets.customerId))
        .innerJoin(injectorModels, eq(injectorModels.id, sets.injectorModelId))
        .innerJoin(people, eq(people.id, certificates.releasedBy))
        .where(where)
        .orderBy(direction(sortColumns[input.sort]), direction(certificates.id))
        .offset(offset)
        .limit(limit);
      const [counted] = await connection
        .select({ total: count() })
        .from(certificates)
        .innerJoin(sets, eq(sets.id, certificates.setId))
        .innerJoin(customers, eq(customers.id, sets.customerId))
        .where(where);
      return { rows, total: counted!.total };
    },
  );
}

function matching(search: string): SQL | undefined {
  if (search === "") return undefined;
  return or(
    containing(sql`lower(${certificates.number})`, search),
    containing(sql`lower(${sets.number})`, search),
    containing(sql`lower(${customers.name})`, search),
  );
}
