import "server-only";
import { and, asc, eq, inArray, sql } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { benchChannels } from "../../db/schema/benches";
import { cycleInjectors } from "../../db/schema/cycles";
import { setInjectors } from "../../db/schema/injectors";
import { instruments } from "../../db/schema/instruments";
import { injectorChecks, readings } from "../../db/schema/readings";
import { groupBy } from "../group-by";
import type { InjectorChecks, RecordedInjector, RecordedReading } from "./results";

/** Per revision: its injectors by place, each with channel, readings and checks. */
export async function loadMeasured(
  connection: Connection,
  revisionIds: string[],
): Promise<Map<string, RecordedInjector[]>> {
  const [placed, read] = await Promise.all([
    selectPlaced(connection, revisionIds),
    selectReadings(connection, revisionIds),
  ]);
  const readingsOf = groupBy(read, (reading) => `${reading.revisionId}/${reading.setInjectorId}`);
  const measured = new Map<string, RecordedInjector[]>(revisionIds.map((id) => [id, []]));
  for (const { revisionId, checks, ...injector } of placed)
    measured.get(revisionId)?.push({
      ...injector,
      readings: (readingsOf.get(`${revisionId}/${injector.setInjectorId}`) ?? []).map(asReading),
      checks: checks ?? nothingChecked,
    });
  return measured;
}

function asReading({ revisionId: _in, setInjectorId: _of, ...reading }: ReadingRow): RecordedReading {
  return reading;
}

const nothingChecked: InjectorChecks = {
  windingOhm: null,
  leadOhm: null,
  windingTemperatureC: null,
  insulationMegohm: null,
  leakageMm3PerMin: null,
  leakagePressureKpa: null,
  leakageSeconds: null,
  sprayGrade: null,
  note: "",
};

function selectPlaced(connection: Connection, revisionIds: string[]) {
  return connection
    .select({
      revisionId: cycleInjectors.revisionId,
      setInjectorId: cycleInjectors.setInjectorId,
      channelNumber: benchChannels.number,
      load: cycleInjectors.load,
      instrumentCode: instruments.code,
      checks: {
        windingOhm: injectorChecks.windingOhm,
        leadOhm: injectorChecks.leadOhm,
        windingTemperatureC: injectorChecks.windingTemperatureC,
        insulationMegohm: injectorChecks.insulationMegohm,
        leakageMm3PerMin: injectorChecks.leakageMm3PerMin,
        leakagePressureKpa: injectorChecks.leakagePressureKpa,
        leakageSeconds: injectorChecks.leakageSeconds,
        sprayGrade: injectorChecks.sprayGrade,
        note: injectorChecks.note,
      },
    })
    .from(cycleInjectors)
    .innerJoin(setInjectors, eq(setInjectors.id, cycleInjectors.setInjectorId))
    .innerJoin(benchChannels, eq(benchChannels.id, cycleInjectors.channelId))
    .innerJoin(instruments, eq(instruments.id, cycleInjectors.instrumentId))
    .leftJoin(
      injectorChecks,
      and(
        eq(injectorChecks.revisionId, cycleInjectors.revisionId),
        eq(injectorChecks.setInjectorId, cycleInjectors.setInjectorId),
      ),
    )
    .where(inArray(cycleInjectors.revisionId, revisionIds))
    .orderBy(asc(setInjectors.position), asc(setInjectors.tag));
}

type ReadingRow = Awaited<ReturnType<typeof selectReadings>>[number];

function selectReadings(connection: Connection, revisionIds: string[]) {
  return connection
    .select({
      revisionId: readings.revisionId,
      setInjectorId: readings.setInjectorId,
      pulseWidthMs: readings.pulseWidthMs,
      pulseCount: readings.pulseCount,
      openSeconds: readings.openSeconds,
      repeat: readings.repeat,
      amount: readings.amount,
    })
    .from(readings)
    .where(inArray(readings.revisionId, revisionIds))
    .orderBy(sql`${readings.pulseWidthMs} nulls last`, asc(readings.repeat));
}
