import "server-only";
import { and, asc, eq, inArray, sql } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { benches } from "../../db/schema/benches";
import { cycleRevisions, cycles } from "../../db/schema/cycles";
import { fluids } from "../../db/schema/fluids";
import { people } from "../../db/schema/people";
import type { Phase } from "../../db/vocabulary";
import { loadCalibrationsUsed } from "./load-calibrations-used";
import { loadMeasured } from "./load-measured";
import type { CycleRevision } from "./results";
import { conditionOf } from "./sheet/condition";

export type CycleOfSet = { cycleId: string; setId: string; phase: Phase; number: number; measuredAt: Date };
export type LoadedRevision = CycleRevision & { cycle: CycleOfSet };

/** Every revision of every cycle of these sets, or only the ones that count; oldest first. */
export async function loadRevisions(
  connection: Connection,
  setIds: string[],
  which: "all" | "that count" = "all",
): Promise<LoadedRevision[]> {
  if (setIds.length === 0) return [];
  const rows = await selectRevisions(connection, setIds, which);
  const ids = rows.map((row) => row.revision.id);
  if (ids.length === 0) return [];
  const [calibrations, measured] = await Promise.all([
    loadCalibrationsUsed(connection, ids),
    loadMeasured(connection, ids),
  ]);
  return rows.map((row) => {
    const used = calibrations.get(row.revision.id) ?? [];
    return { ...asRevision(row, used), injectors: measured.get(row.revision.id) ?? [] };
  });
}

type Row = Awaited<ReturnType<typeof selectRevisions>>[number];

function selectRevisions(connection: Connection, setIds: string[], which: "all" | "that count") {
  const counts = sql`not exists (select from cycle_revisions later_revision
      where later_revision.cycle_id = ${cycles.id} and later_revision.revision > ${cycleRevisions.revision})
    and not exists (select from cycles later_cycle where later_cycle.set_id = ${cycles.setId}
      and later_cycle.phase = ${cycles.phase} and later_cycle.number > ${cycles.number})`;
  return connection
    .select({
      cycle: cycles,
      revision: cycleRevisions,
      bench: { benchId: benches.id, code: benches.code, location: benches.location },
      fluid: {
        fluidId: fluids.id,
        name: fluids.name,
        densityAt15GPerMl: fluids.densityAt15GPerMl,
        expansionPerK: fluids.expansionPerK,
      },
      recorder: {
        personId: people.id,
        name: people.name,
        roles: sql<
          CycleRevision["recordedBy"]["roles"]
        >`array(select role from person_roles where person_roles.person_id = ${people.id} order by role)`,
      },
    })
    .from(cycleRevisions)
    .innerJoin(cycles, eq(cycles.id, cycleRevisions.cycleId))
    .innerJoin(benches, eq(benches.id, cycleRevisions.benchId))
    .innerJoin(fluids, eq(fluids.id, cycleRevisions.fluidId))
    .innerJoin(people, eq(people.id, cycleRevisions.recordedBy))
    .where(and(inArray(cycles.setId, setIds), which === "that count" ? counts : undefined))
    .orderBy(asc(cycles.recordedAt), asc(cycles.number), asc(cycleRevisions.revision));
}

function asRevision(row: Row, used: CycleRevision["calibrations"]): Omit<LoadedRevision, "injectors"> {
  const { revision, cycle, bench, fluid, recorder } = row;
  const condition = (kind: CycleRevision["calibrations"][number]["kind"], indicated: number) => {
    const entry = used.find((calibration) => calibration.kind === kind);
    return conditionOf(entry && { division: entry.division, calibration: entry }, indicated);
  };
  return {
    cycle: {
      cycleId: cycle.id,
      setId: cycle.setId,
      phase: cycle.phase,
      number: cycle.number,
      measuredAt: cycle.recordedAt,
    },
    cycleRevisionId: revision.id,
    revision: revision.revision,
    reason: revision.reason,
    recordedBy: recorder,
    recordedAt: revision.recordedAt,
    bench,
    fluid,
    fluidTemperatureC: condition("thermometer", revision.fluidTemperatureC),
    pressureKpa: condition("pressure gauge", revision.pressureKpa),
    driveVolts: condition("drive supply", revision.driveVolts),
    driverKind: revision.driverKind,
    periodMs: condition("pulse timer", revision.periodMs),
    collects: revision.collects,
    repeatability: revision.repeatability,
    note: revision.note,
    acknowledged: revision.acknowledged,
    calibrations: used,
  };
}
