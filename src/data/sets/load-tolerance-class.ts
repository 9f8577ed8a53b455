import "server-only";
import { asc, desc, eq } from "drizzle-orm";
import type { Connection } from "../../db/client";
import {
  toleranceClasses,
  toleranceClassLimits,
  toleranceClassRevisions,
} from "../../db/schema/tolerance-classes";
import type { SetToleranceClass } from "./types";

/** The class as its latest revision states it. */
export async function loadToleranceClass(
  connection: Connection,
  toleranceClassId: string,
): Promise<SetToleranceClass> {
  const [latest] = await connection
    .select({
      toleranceClassId: toleranceClasses.id,
      name: toleranceClasses.name,
      revisionId: toleranceClassRevisions.id,
      revision: toleranceClassRevisions.revision,
      staticSpreadPercent: toleranceClassRevisions.staticSpreadPercent,
      deadTimeRangeMs: toleranceClassRevisions.deadTimeRangeMs,
      resistanceRangeOhm: toleranceClassRevisions.resistanceRangeOhm,
      leakageLimitMm3PerMin: toleranceClassRevisions.leakageLimitMm3PerMin,
    })
    .from(toleranceClassRevisions)
    .innerJoin(toleranceClasses, eq(toleranceClasses.id, toleranceClassRevisions.toleranceClassId))
    .where(eq(toleranceClasses.id, toleranceClassId))
    .orderBy(desc(toleranceClassRevisions.revision))
    .limit(1);
  if (!latest) throw new Error(`Tolerance class ${toleranceClassId} has no revision`);
  const spreadLimits = await connection
    .select({
      fromPulseWidthMs: toleranceClassLimits.fromPulseWidthMs,
      spreadPercent: toleranceClassLimits.spreadPercent,
    })
    .from(toleranceClassLimits)
    .where(eq(toleranceClassLimits.revisionId, latest.revisionId))
    .orderBy(asc(toleranceClassLimits.fromPulseWidthMs));
  return { ...latest, spreadLimits };
}
