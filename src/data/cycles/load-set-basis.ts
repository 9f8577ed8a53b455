import "server-only";
import { asc, desc, eq, inArray } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { customers } from "../../db/schema/customers";
import { labDetails } from "../../db/schema/lab";
import { injectorModels } from "../../db/schema/models";
import { sets } from "../../db/schema/sets";
import {
  toleranceClasses,
  toleranceClassLimits,
  toleranceClassRevisions,
} from "../../db/schema/tolerance-classes";
import type { JudgedClass } from "./results";

export type SetBasis = Awaited<ReturnType<typeof selectBasis>>[number] & { toleranceClass: JudgedClass };

/** What the figures of these sets rest on besides their readings: model, reference and tolerance class as they stand. */
export async function loadSetBasis(connection: Connection, setIds: string[]): Promise<Map<string, SetBasis>> {
  if (setIds.length === 0) return new Map();
  const rows = await selectBasis(connection, setIds);
  const classes = await loadClasses(connection, [...new Set(rows.map((row) => row.toleranceClassId))]);
  return new Map(
    rows.map((row) => [row.setId, { ...row, toleranceClass: classes.get(row.toleranceClassId)! }]),
  );
}

function selectBasis(connection: Connection, setIds: string[]) {
  return connection
    .select({
      setId: sets.id,
      number: sets.number,
      stage: sets.stage,
      workAsked: sets.workAsked,
      customerName: customers.name,
      toleranceClassId: sets.toleranceClassId,
      zone: labDetails.timeZone,
      model: {
        make: injectorModels.make,
        partNumber: injectorModels.partNumber,
        resistanceLowOhm: injectorModels.resistanceLowOhm,
        resistanceHighOhm: injectorModels.resistanceHighOhm,
        ratedFlowMlPerMin: injectorModels.ratedFlowMlPerMin,
        ratedFlowBandPercent: injectorModels.ratedFlowBandPercent,
        ratedPressureKpa: injectorModels.ratedPressureKpa,
        leakageLimitMm3PerMin: injectorModels.leakageLimitMm3PerMin,
        leakagePressureKpa: injectorModels.leakagePressureKpa,
      },
      reference: {
        pressureKpa: injectorModels.ratedPressureKpa,
        densityGPerMl: labDetails.referenceDensityGPerMl,
        fluid: labDetails.referenceFluid,
      },
    })
    .from(sets)
    .innerJoin(customers, eq(customers.id, sets.customerId))
    .innerJoin(injectorModels, eq(injectorModels.id, sets.injectorModelId))
    .innerJoin(labDetails, eq(labDetails.id, 1))
    .where(inArray(sets.id, setIds));
}

async function loadClasses(connection: Connection, classIds: string[]): Promise<Map<string, JudgedClass>> {
  const rows = await connection
    .selectDistinctOn([toleranceClassRevisions.toleranceClassId], {
      toleranceClassId: toleranceClassRevisions.toleranceClassId,
      toleranceClassRevisionId: toleranceClassRevisions.id,
      name: toleranceClasses.name,
      revision: toleranceClassRevisions.revision,
      staticSpreadPercent: toleranceClassRevisions.staticSpreadPercent,
      deadTimeRangeMs: toleranceClassRevisions.deadTimeRangeMs,
      resistanceRangeOhm: toleranceClassRevisions.resistanceRangeOhm,
      leakageLimitMm3PerMin: toleranceClassRevisions.leakageLimitMm3PerMin,
    })
    .from(toleranceClassRevisions)
    .innerJoin(toleranceClasses, eq(toleranceClasses.id, toleranceClassRevisions.toleranceClassId))
    .where(inArray(toleranceClassRevisions.toleranceClassId, classIds))
    .orderBy(toleranceClassRevisions.toleranceClassId, desc(toleranceClassRevisions.revision));
  const limits = await connection
    .select()
    .from(toleranceClassLimits)
    .where(
      inArray(
        toleranceClassLimits.revisionId,
        rows.map((row) => row.toleranceClassRevisionId),
      ),
    )
    .orderBy(asc(toleranceClassLimits.fromPulseWidthMs));
  return new Map(
    rows.map((row) => [
      row.toleranceClassId,
      {
        ...row,
        spreadLimits: limits
          .filter((limit) => limit.revisionId === row.toleranceClassRevisionId)
          .map(({ fromPulseWidthMs, spreadPercent }) => ({ fromPulseWidthMs, spreadPercent })),
      },
    ]),
  );
}
