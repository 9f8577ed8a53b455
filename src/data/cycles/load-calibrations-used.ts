import "server-only";
import { asc, eq, inArray } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { benchChannels } from "../../db/schema/benches";
import { calibrations } from "../../db/schema/calibrations";
import { cycleInjectors, cycleInstruments } from "../../db/schema/cycles";
import { instruments } from "../../db/schema/instruments";
import type { UsedCalibration } from "./results";

const columns = {
  calibrationId: calibrations.id,
  instrumentId: instruments.id,
  instrumentCode: instruments.code,
  kind: instruments.kind,
  division: instruments.division,
  rangeHigh: instruments.rangeHigh,
  reference: calibrations.reference,
  validFrom: calibrations.validFrom,
  validUntil: calibrations.validUntil,
  gain: calibrations.gain,
  offset: calibrations.offset,
  gainU: calibrations.gainU,
  offsetU: calibrations.offsetU,
  endedAs: calibrations.endedAs,
  endedAt: calibrations.endedAt,
  endedReason: calibrations.endedReason,
};

/** Per revision: the channels' cylinders or balances by channel, then the bench's instruments by code. */
export async function loadCalibrationsUsed(
  connection: Connection,
  revisionIds: string[],
): Promise<Map<string, UsedCalibration[]>> {
  const [ofChannels, ofBenches] = await Promise.all([
    selectOfChannels(connection, revisionIds),
    selectOfBenches(connection, revisionIds),
  ]);
  const used = new Map<string, UsedCalibration[]>(revisionIds.map((id) => [id, []]));
  for (const { revisionId, ...calibration } of ofChannels) used.get(revisionId)?.push(calibration);
  for (const { revisionId, ...calibration } of ofBenches)
    used.get(revisionId)?.push({ ...calibration, channelNumber: null });
  return used;
}

function selectOfChannels(connection: Connection, revisionIds: string[]) {
  return connection
    .selectDistinct({
      revisionId: cycleInjectors.revisionId,
      channelNumber: benchChannels.number,
      ...columns,
    })
    .from(cycleInjectors)
    .innerJoin(benchChannels, eq(benchChannels.id, cycleInjectors.channelId))
    .innerJoin(calibrations, eq(calibrations.id, cycleInjectors.calibrationId))
    .innerJoin(instruments, eq(instruments.id, cycleInjectors.instrumentId))
    .where(inArray(cycleInjectors.revisionId, revisionIds))
    .orderBy(asc(benchChannels.number));
}

function selectOfBenches(connection: Connection, revisionIds: string[]) {
  return connection
    .select({ revisionId: cycleInstruments.revisionId, ...columns })
    .from(cycleInstruments)
    .innerJoin(calibrations, eq(calibrations.id, cycleInstruments.calibrationId))
    .innerJoin(instruments, eq(instruments.id, cycleInstruments.instrumentId))
    .where(inArray(cycleInstruments.revisionId, revisionIds))
    .orderBy(asc(instruments.code));
}
