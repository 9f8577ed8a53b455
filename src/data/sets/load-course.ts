import "server-only";
import { asc, eq } from "drizzle-orm";
import { alias } from "drizzle-orm/pg-core";
import type { Connection } from "../../db/client";
import { people } from "../../db/schema/people";
import { handOvers, setHolds, setSteps } from "../../db/schema/sets";
import type { CourseStep, HandOver } from "./types";

export function loadCourse(connection: Connection, setId: string): Promise<CourseStep[]> {
  return connection
    .select({
      from: setSteps.fromStage,
      to: setSteps.toStage,
      at: setSteps.at,
      by: people.name,
      reason: setSteps.reason,
    })
    .from(setSteps)
    .innerJoin(people, eq(people.id, setSteps.personId))
    .where(eq(setSteps.setId, setId))
    .orderBy(asc(setSteps.at));
}

const cleared = alias(people, "cleared");

export async function loadHolds(connection: Connection, setId: string) {
  const rows = await connection
    .select({
      reason: setHolds.reason,
      heldAt: setHolds.heldAt,
      heldBy: people.name,
      clearedAt: setHolds.clearedAt,
      clearedBy: cleared.name,
      clearedReason: setHolds.clearedReason,
    })
    .from(setHolds)
    .innerJoin(people, eq(people.id, setHolds.heldBy))
    .leftJoin(cleared, eq(cleared.id, setHolds.clearedBy))
    .where(eq(setHolds.setId, setId))
    .orderBy(asc(setHolds.heldAt));
  const open = rows.find((row) => row.clearedAt === null);
  return {
    hold: open ? { reason: open.reason, heldAt: open.heldAt, heldBy: open.heldBy } : null,
    earlierHolds: rows.flatMap(({ clearedAt, clearedBy, clearedReason, ...hold }) =>
      clearedAt
        ? [{ ...hold, clearedAt, clearedBy: clearedBy ?? "", clearedReason: clearedReason ?? "" }]
        : [],
    ),
  };
}

export async function loadHandOver(connection: Connection, setId: string): Promise<HandOver | null> {
  const [found] = await connection
    .select({
      takenBy: handOvers.takenBy,
      way: handOvers.way,
      consignment: handOvers.consignment,
      handedOverBy: people.name,
      at: handOvers.at,
    })
    .from(handOvers)
    .innerJoin(people, eq(people.id, handOvers.handedOverBy))
    .where(eq(handOvers.setId, setId));
  return found ?? null;
}
