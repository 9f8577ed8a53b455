import "server-only";
import { desc, eq, inArray, or, sql } from "drizzle-orm";
import { alias } from "drizzle-orm/pg-core";
import type { Connection } from "../../db/client";
import { calibrations } from "../../db/schema/calibrations";
import { certificates } from "../../db/schema/certificates";
import { cycleInjectors, cycleInstruments } from "../../db/schema/cycles";
import { people } from "../../db/schema/people";
import { groupBy } from "../group-by";
import type { InstrumentCalibration, RestingCertificate } from "./types";

const ender = alias(people, "ender");
const corrected = alias(calibrations, "corrected");
const inForce = sql<boolean>`(tstzrange(${calibrations.validFrom}, ${calibrations.validUntil}) @> record_now()
  and (${calibrations.endedAt} is null or ${calibrations.endedAt} > record_now()))`;

/** Everything that was ever recorded of these instruments' calibrations, the newest first. */
export async function loadCalibrations(
  connection: Connection,
  instrumentIds: string[],
): Promise<Map<string, InstrumentCalibration[]>> {
  if (instrumentIds.length === 0) return new Map();
  const rows = await selectCalibrations(connection, instrumentIds);
  const resting = await certificatesResting(
    connection,
    rows.map((row) => row.calibrationId),
  );
  const entries = rows.map(
    ({ correctedReference, correctionReason, endedAs, endedAt, endedBy, endedReason, ...row }) => ({
      ...row,
      corrects: correctedReference ? { reference: correctedReference, reason: correctionReason ?? "" } : null,
      ended:
        endedAs && endedAt
          ? { as: endedAs, at: endedAt, by: endedBy ?? "", reason: endedReason ?? "" }
          : null,
      certificates: resting.get(row.calibrationId) ?? [],
    }),
  );
  return groupBy(entries, (entry) => entry.instrumentId);
}

function selectCalibrations(connection: Connection, instrumentIds: string[]) {
  return connection
    .select({
      calibrationId: calibrations.id,
      instrumentId: calibrations.instrumentId,
      reference: calibrations.reference,
      validFrom: calibrations.validFrom,
      validUntil: calibrations.validUntil,
      inForce,
      gain: calibrations.gain,
      offset: calibrations.offset,
      gainU: calibrations.gainU,
      offsetU: calibrations.offsetU,
      note: calibrations.note,
      recordedBy: people.name,
      recordedAt: calibrations.recordedAt,
      correctedReference: corrected.reference,
      correctionReason: calibrations.correctionReason,
      endedAs: calibrations.endedAs,
      endedAt: calibrations.endedAt,
      endedBy: ender.name,
      endedReason: calibrations.endedReason,
    })
    .from(calibrations)
    .innerJoin(people, eq(people.id, calibrations.recordedBy))
    .leftJoin(ender, eq(ender.id, calibrations.endedBy))
    .leftJoin(corrected, eq(corrected.id, calibrations.correctsId))
    .where(inArray(calibrations.instrumentId, instrumentIds))
    .orderBy(desc(calibrations.validFrom), desc(calibrations.recordedAt));
}

/** Which certificates' figures rest on which of these calibrations. */
export async function certificatesResting(
  connection: Connection,
  calibrationIds: string[],
): Promise<Map<string, RestingCertificate[]>> {
  if (calibrationIds.length === 0) return new Map();
  const used = connection
    .select({ calibrationId: cycleInjectors.calibrationId, revisionId: cycleInjectors.revisionId })
    .from(cycleInjectors)
    .where(inArray(cycleInjectors.calibrationId, calibrationIds))
    .union(
      connection
        .select({ calibrationId: cycleInstruments.calibrationId, revisionId: cycleInstruments.revisionId })
        .from(cycleInstruments)
        .where(inArray(cycleInstruments.calibrationId, calibrationIds)),
    )
    .as("used");
  const rows = await connection
    .selectDistinct({
      calibrationId: used.calibrationId,
      certificateId: certificates.id,
      number: certificates.number,
      state: certificates.state,
    })
    .from(used)
    .innerJoin(
      certificates,
      or(
        eq(certificates.asFoundRevisionId, used.revisionId),
        eq(certificates.asLeftRevisionId, used.revisionId),
      ),
    )
    .orderBy(desc(certificates.number));
  return groupBy(rows, (row) => row.calibrationId);
}
