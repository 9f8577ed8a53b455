import "server-only";
import { and, asc, eq, gt, isNull, lte, or, type SQL, sql } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { recordNow } from "../../db/columns";
import { benchChannels, benches, benchHolds, benchInstruments } from "../../db/schema/benches";
import { calibrations } from "../../db/schema/calibrations";
import { instruments } from "../../db/schema/instruments";
import type { BenchInstrument, CycleBench } from "./sheet/types";

/**
 * Benches with the instruments they had at a moment and the calibration then in force on each. Where a calibration was
 * corrected since, the correction counts.
 */
export async function loadBenches(
  connection: Connection,
  { at, benchId }: { at?: Date; benchId?: string } = {},
): Promise<CycleBench[]> {
  const moment = at ? sql`${at.toISOString()}::timestamptz` : recordNow;
  const where = benchId ? eq(benches.id, benchId) : isNull(benches.retiredAt);
  const [found, channels, placed] = await Promise.all([
    selectBenches(connection, where),
    connection.select().from(benchChannels).orderBy(asc(benchChannels.number)),
    selectInstruments(connection, moment),
  ]);
  return found.map((bench) => ({
    ...bench,
    channels: channels
      .filter((channel) => channel.benchId === bench.benchId)
      .map(({ id, number }) => ({
        channelId: id,
        number,
        instrument: placed.find((place) => place.channelId === id)?.instrument ?? null,
      })),
    instruments: placed
      .filter((place) => place.benchId === bench.benchId && place.channelId === null)
      .map((place) => place.instrument),
  }));
}

function selectBenches(connection: Connection, where: SQL | undefined) {
  return connection
    .select({
      benchId: benches.id,
      code: benches.code,
      location: benches.location,
      collects: benches.collects,
      repeatability: benches.repeatability,
      fluidId: benches.fluidId,
      driveVolts: benches.driveVolts,
      driverKind: benches.driverKind,
      periodMs: benches.periodMs,
      holdReason: benchHolds.reason,
      retired: sql<boolean>`${benches.retiredAt} is not null`,
    })
    .from(benches)
    .leftJoin(benchHolds, and(eq(benchHolds.benchId, benches.id), isNull(benchHolds.clearedAt)))
    .where(where)
    .orderBy(asc(benches.code));
}

async function selectInstruments(connection: Connection, moment: SQL) {
  const inForce = connection
    .select()
    .from(calibrations)
    .where(
      sql`${calibrations.instrumentId} = ${instruments.id}
        and tstzrange(${calibrations.validFrom}, ${calibrations.validUntil}) @> ${moment}
        and (${calibrations.endedAt} is null or ${calibrations.endedAt} > ${moment})`,
    )
    .orderBy(sql`${calibrations.endedAt} is null desc, ${calibrations.recordedAt} desc`)
    .limit(1)
    .as("in_force");
  const rows = await connection
    .select({
      benchId: benchInstruments.benchId,
      channelId: benchInstruments.channelId,
      instrument: instruments,
      calibration: {
        calibrationId: inForce.id,
        reference: inForce.reference,
        validUntil: inForce.validUntil,
        gain: inForce.gain,
        offset: inForce.offset,
        gainU: inForce.gainU,
        offsetU: inForce.offsetU,
      },
      lapsedAt: sql<Date | null>`(select max(least(c.valid_until, coalesce(c.ended_at, c.valid_until)))
        from calibrations c where c.instrument_id = ${instruments.id} and c.valid_from <= ${moment})`.mapWith(
        calibrations.validUntil,
      ),
    })
    .from(benchInstruments)
    .innerJoin(instruments, eq(instruments.id, benchInstruments.instrumentId))
    .leftJoinLateral(inForce, sql`true`)
    .where(
      and(
        lte(benchInstruments.sinceAt, moment),
        or(isNull(benchInstruments.untilAt), gt(benchInstruments.untilAt, moment)),
      ),
    )
    .orderBy(asc(instruments.code));
  return rows.map((row) => ({
    benchId: row.benchId,
    channelId: row.channelId,
    instrument: asBenchInstrument(row),
  }));
}

type InstrumentRow = {
  instrument: typeof instruments.$inferSelect;
  calibration:
    | (Omit<NonNullable<BenchInstrument["calibration"]>, "validUntil"> & { validUntil: Date })
    | null;
  lapsedAt: Date | null;
};

function asBenchInstrument({ instrument, calibration, lapsedAt }: InstrumentRow): BenchInstrument {
  const { id: instrumentId, code, kind, division, rangeHigh } = instrument;
  return {
    instrumentId,
    code,
    kind,
    division,
    rangeHigh,
    calibration: calibration && { ...calibration, validUntil: calibration.validUntil.toISOString() },
    lapsedAt: calibration ? null : (lapsedAt?.toISOString() ?? null),
  };
}
