import "server-only";
import { and, eq, sql } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { customers } from "../../db/schema/customers";
import { labDetails } from "../../db/schema/lab";
import { injectorModels } from "../../db/schema/models";
import { people } from "../../db/schema/people";
import { sets } from "../../db/schema/sets";
import type { Context } from "../access/actor";
import { type Grant, grantedRight } from "../access/authorize";
import { notFound } from "../access/errors";
import { modelColumns } from "../models";
import { read } from "../read";
import { getSetInput } from "./inputs";
import { daysLate, setsWithin } from "./internal";
import { loadCourse, loadHandOver, loadHolds } from "./load-course";
import { loadInjectors } from "./load-injectors";
import { loadPhotos } from "./load-photos";
import { loadToleranceClass } from "./load-tolerance-class";
import type { SetCustomer, SetDetail } from "./types";

export function getSet(context: Context, raw: unknown): Promise<SetDetail> {
  return read(context, "getSet", getSetInput, raw, async ({ connection, input, grant }) => {
    const { toleranceClassId, internalNote, customer, ...set } = await selectSet(
      connection,
      input.setId,
      grant,
    );
    const [toleranceClass, injectors, course, holds, photos, handOver] = await Promise.all([
      loadToleranceClass(connection, toleranceClassId),
      loadInjectors(connection, input.setId, grant),
      loadCourse(connection, input.setId),
      loadHolds(connection, input.setId),
      loadPhotos(connection, input.setId, grant),
      loadHandOver(connection, input.setId),
    ]);
    return {
      ...set,
      customer: grantedRight(context.actor, "getCustomer") === "name only" ? nameOnly(customer) : customer,
      internalNote: grant.customerIds ? null : internalNote,
      toleranceClass,
      injectors,
      course,
      ...holds,
      photos,
      handOver,
    };
  });
}

function nameOnly({ customerId, name }: SetCustomer): SetCustomer {
  return { customerId, name, contactName: null, email: null, phone: null };
}

async function selectSet(connection: Connection, setId: string, grant: Grant) {
  const [found] = await connection
    .select({
      setId: sets.id,
      number: sets.number,
      version: sets.version,
      stage: sets.stage,
      customer: {
        customerId: customers.id,
        name: customers.name,
        contactName: sql<string | null>`${customers.contactName}`,
        email: sql<string | null>`${customers.email}`,
        phone: sql<string | null>`${customers.phone}`,
      },
      model: modelColumns,
      toleranceClassId: sets.toleranceClassId,
      workAsked: sets.workAsked,
      customerRequest: sets.customerRequest,
      internalNote: sets.internalNote,
      promisedOn: sets.promisedOn,
      daysLate,
      checkedInAt: sets.checkedInAt,
      checkedInBy: people.name,
    })
    .from(sets)
    .innerJoin(customers, eq(customers.id, sets.customerId))
    .innerJoin(injectorModels, eq(injectorModels.id, sets.injectorModelId))
    .innerJoin(people, eq(people.id, sets.checkedInBy))
    .innerJoin(labDetails, eq(labDetails.id, 1))
    .where(and(eq(sets.id, setId), setsWithin(grant)));
  if (!found) throw notFound("set");
  return found;
}
