import "server-only";
import { asc, eq, sql } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { cleaningRuns } from "../../db/schema/cleaning-runs";
import { people } from "../../db/schema/people";
import type { StaffRole } from "../../db/vocabulary";

/** The runs that count, oldest first, each with the entries that it corrects, newest first. */
export async function loadCleaningRuns(connection: Connection, setId: string) {
  const rows = await selectRuns(connection, setId);
  const entries = new Map(rows.map((row) => [row.cleaningRunId, row]));
  const corrected = new Set(rows.map((row) => row.correctsId));
  return rows
    .filter((row) => !corrected.has(row.cleaningRunId))
    .map(({ correctsId, ...run }) => ({ ...run, corrects: chainFrom(correctsId) }))
    .sort((a, b) => firstTime(a) - firstTime(b));

  function chainFrom(cleaningRunId: string | null): Omit<(typeof rows)[number], "correctsId">[] {
    const entry = cleaningRunId ? entries.get(cleaningRunId) : undefined;
    if (!entry) return [];
    const { correctsId, ...run } = entry;
    return [run, ...chainFrom(correctsId)];
  }
}

function firstTime(run: { recordedAt: Date; corrects: { recordedAt: Date }[] }): number {
  return (run.corrects.at(-1) ?? run).recordedAt.getTime();
}

function selectRuns(connection: Connection, setId: string) {
  return connection
    .select({
      cleaningRunId: cleaningRuns.id,
      bath: cleaningRuns.bath,
      detergentBatch: cleaningRuns.detergentBatch,
      minutes: cleaningRuns.minutes,
      temperatureC: cleaningRuns.temperatureC,
      backFlushed: cleaningRuns.backFlushed,
      partsRenewed: cleaningRuns.partsRenewed,
      note: cleaningRuns.note,
      correctsId: cleaningRuns.correctsId,
      correctionReason: cleaningRuns.correctionReason,
      recordedAt: cleaningRuns.recordedAt,
      recordedBy: {
        personId: people.id,
        name: people.name,
        roles: sql<
          StaffRole[]
        >`array(select role from person_roles where person_roles.person_id = ${people.id} order by role)`,
      },
    })
    .from(cleaningRuns)
    .innerJoin(people, eq(people.id, cleaningRuns.recordedBy))
    .where(eq(cleaningRuns.setId, setId))
    .orderBy(asc(cleaningRuns.recordedAt));
}
