import "server-only";
import { and, asc, eq, gt, isNull, type SQL, sql } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { recordNow } from "../../db/columns";
import { benchChannels, benchInstruments } from "../../db/schema/benches";
import { calibrations } from "../../db/schema/calibrations";
import { instruments } from "../../db/schema/instruments";
import { groupBy } from "../group-by";
import { coveredUntil } from "./status";

/** The instruments that stand on benches now, each with how long it stays in calibration. */
export async function loadPlaced(connection: Connection, now: Date, where?: SQL) {
  const placed = await connection
    .select({
      benchId: benchInstruments.benchId,
      channelId: benchInstruments.channelId,
      channelNumber: benchChannels.number,
      instrumentId: instruments.id,
      kind: instruments.kind,
      version: instruments.version,
      code: instruments.code,
      maker: instruments.maker,
      serial: instruments.serial,
      rangeHigh: instruments.rangeHigh,
      division: instruments.division,
      intervalMonths: instruments.intervalMonths,
      since: benchInstruments.sinceAt,
    })
    .from(benchInstruments)
    .innerJoin(instruments, eq(instruments.id, benchInstruments.instrumentId))
    .leftJoin(benchChannels, eq(benchChannels.id, benchInstruments.channelId))
    .where(and(isNull(benchInstruments.untilAt), where))
    .orderBy(sql`${benchChannels.number} nulls last`, asc(instruments.code));
  const open = await connection
    .select({
      instrumentId: calibrations.instrumentId,
      validFrom: calibrations.validFrom,
      validUntil: calibrations.validUntil,
    })
    .from(calibrations)
    .where(and(isNull(calibrations.endedAt), gt(calibrations.validUntil, recordNow)));
  const periods = groupBy(open, (period) => period.instrumentId);
  return placed.map((instrument) => ({
    ...instrument,
    calibratedUntil: coveredUntil(periods.get(instrument.instrumentId) ?? [], now),
  }));
}
