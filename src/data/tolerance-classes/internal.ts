import "server-only";
import { asc, desc, eq, inArray } from "drizzle-orm";
import type { z } from "zod";
import type { Connection, Transaction } from "../../db/client";
import { people } from "../../db/schema/people";
import { toleranceClassLimits, toleranceClassRevisions } from "../../db/schema/tolerance-classes";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { groupBy } from "../group-by";
import type { addToleranceClassInput } from "./inputs";

export type ClassLimits = Omit<z.output<typeof addToleranceClassInput>, "name" | "idempotencyKey">;

export type ToleranceClassRevision = Omit<ClassLimits, "limits"> & {
  revisionId: string;
  revision: number;
  recordedBy: string;
  recordedAt: Date;
  /** By pulse width, each limit holding up to the next one's. */
  spreadLimits: { fromPulseWidthMs: number; spreadPercent: number }[];
};

/** A revision with its limits; what stood before stays as it was. */
export async function insertRevision(
  transaction: Transaction,
  context: Context,
  { toleranceClassId, revision }: { toleranceClassId: string; revision: number },
  { limits, ...values }: ClassLimits,
): Promise<void> {
  const [added] = await transaction
    .insert(toleranceClassRevisions)
    .values({ ...values, toleranceClassId, revision, recordedBy: requirePerson(context).personId })
    .returning({ id: toleranceClassRevisions.id });
  if (limits.length > 0)
    await transaction
      .insert(toleranceClassLimits)
      .values(limits.map((limit) => ({ ...limit, revisionId: added!.id })));
}

/** Every revision of these classes, the newest first, in two queries. */
export async function loadRevisions(
  connection: Connection,
  toleranceClassIds: string[],
): Promise<Map<string, ToleranceClassRevision[]>> {
  if (toleranceClassIds.length === 0) return new Map();
  const rows = await connection
    .select({
      toleranceClassId: toleranceClassRevisions.toleranceClassId,
      revisionId: toleranceClassRevisions.id,
      revision: toleranceClassRevisions.revision,
      staticSpreadPercent: toleranceClassRevisions.staticSpreadPercent,
      deadTimeRangeMs: toleranceClassRevisions.deadTimeRangeMs,
      resistanceRangeOhm: toleranceClassRevisions.resistanceRangeOhm,
      leakageLimitMm3PerMin: toleranceClassRevisions.leakageLimitMm3PerMin,
      recordedBy: people.name,
      recordedAt: toleranceClassRevisions.recordedAt,
    })
    .from(toleranceClassRevisions)
    .innerJoin(people, eq(people.id, toleranceClassRevisions.recordedBy))
    .where(inArray(toleranceClassRevisions.toleranceClassId, toleranceClassIds))
    .orderBy(desc(toleranceClassRevisions.revision));
  const limits = groupBy(
    await selectLimits(
      connection,
      rows.map((row) => row.revisionId),
    ),
    (limit) => limit.revisionId,
  );
  const revisions = rows.map((row) => ({
    ...row,
    spreadLimits: (limits.get(row.revisionId) ?? []).map(({ revisionId: _revision, ...limit }) => limit),
  }));
  return groupBy(revisions, (revision) => revision.toleranceClassId);
}

function selectLimits(connection: Connection, revisionIds: string[]) {
  return connection
    .select()
    .from(toleranceClassLimits)
    .where(inArray(toleranceClassLimits.revisionId, revisionIds))
    .orderBy(asc(toleranceClassLimits.fromPulseWidthMs));
}
