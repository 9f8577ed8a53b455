import "server-only";
import { and, desc, eq, isNotNull } from "drizzle-orm";
import { alias } from "drizzle-orm/pg-core";
import type { Connection } from "../../db/client";
import { benchChannels, benchHolds, benchInstruments } from "../../db/schema/benches";
import { instruments } from "../../db/schema/instruments";
import { people } from "../../db/schema/people";
import type { EarlierInstrument } from "./types";

const clearer = alias(people, "clearer");

/** The open hold, and those that are over, newest first. */
export async function loadBenchHolds(connection: Connection, benchId: string) {
  const rows = await connection
    .select({
      reason: benchHolds.reason,
      by: people.name,
      at: benchHolds.heldAt,
      clearedBy: clearer.name,
      clearedAt: benchHolds.clearedAt,
      clearedReason: benchHolds.clearedReason,
    })
    .from(benchHolds)
    .innerJoin(people, eq(people.id, benchHolds.heldBy))
    .leftJoin(clearer, eq(clearer.id, benchHolds.clearedBy))
    .where(eq(benchHolds.benchId, benchId))
    .orderBy(desc(benchHolds.heldAt));
  const open = rows.find((row) => row.clearedAt === null);
  return {
    hold: open ? { reason: open.reason, by: open.by, at: open.at } : null,
    earlierHolds: rows.flatMap(({ clearedAt, clearedBy, clearedReason, ...hold }) =>
      clearedAt
        ? [{ ...hold, clearedAt, clearedBy: clearedBy ?? "", clearedReason: clearedReason ?? "" }]
        : [],
    ),
  };
}

export async function loadEarlierInstruments(
  connection: Connection,
  benchId: string,
): Promise<EarlierInstrument[]> {
  const rows = await connection
    .select({
      instrumentId: instruments.id,
      code: instruments.code,
      channelNumber: benchChannels.number,
      since: benchInstruments.sinceAt,
      until: benchInstruments.untilAt,
    })
    .from(benchInstruments)
    .innerJoin(instruments, eq(instruments.id, benchInstruments.instrumentId))
    .leftJoin(benchChannels, eq(benchChannels.id, benchInstruments.channelId))
    .where(and(eq(benchInstruments.benchId, benchId), isNotNull(benchInstruments.untilAt)))
    .orderBy(desc(benchInstruments.untilAt));
  return rows.flatMap(({ until, ...row }) => (until ? [{ ...row, until }] : []));
}
