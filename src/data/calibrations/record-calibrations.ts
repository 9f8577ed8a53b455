import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import type { z } from "zod";
import type { Transaction } from "../../db/client";
import { benchInstruments } from "../../db/schema/benches";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { invalid, refused } from "../access/errors";
import { write } from "../write";
import { endCalibration } from "./end-calibration";
import { recordCalibrationsInput } from "./inputs";
import { findOverlap, insertCalibration, lockInstrument, overlapRefusal, readPeriod } from "./internal";

type Entry = NonNullable<z.output<typeof recordCalibrationsInput>["entries"][number]>;

/** The calibrations of a bench's instruments, all of them or none. */
export function recordCalibrations(context: Context, raw: unknown) {
  return write(
    context,
    "recordCalibrations",
    recordCalibrationsInput,
    raw,
    async ({ transaction, input, record }) => {
      const { benchId, entries, takeOver } = input;
      const here = await instrumentsOn(transaction, benchId);
      const recorded = [];
      for (const [index, entry] of entries.entries()) {
        if (!entry) continue;
        if (!here.has(entry.instrumentId))
          throw refused("An instrument in the table is no longer on this bench.");
        recorded.push(await recordOne(transaction, context, { entry, index, takeOver }));
      }
      await record({
        event: "calibrations recorded",
        noun: "bench",
        objectId: benchId,
        after: { calibrations: recorded },
      });
      return { benchId, recorded: recorded.length };
    },
  );
}

async function instrumentsOn(transaction: Transaction, benchId: string): Promise<Set<string>> {
  const rows = await transaction
    .select({ instrumentId: benchInstruments.instrumentId })
    .from(benchInstruments)
    .where(and(eq(benchInstruments.benchId, benchId), isNull(benchInstruments.untilAt)));
  return new Set(rows.map((row) => row.instrumentId));
}

async function recordOne(
  transaction: Transaction,
  context: Context,
  { entry, index, takeOver }: { entry: Entry; index: number; takeOver: boolean },
) {
  const { instrumentId, validFrom: fromDay, validUntil: untilDay, ...values } = entry;
  const { code } = await lockInstrument(transaction, instrumentId);
  const { now, zone, ...period } = await readPeriod(transaction, {
    validFrom: fromDay,
    validUntil: untilDay,
  });
  const standing = await findOverlap(transaction, instrumentId, period);
  if (standing) {
    // What was measured under the earlier one keeps it, so the new one begins where the earlier one ends: now.
    const canTakeOver = takeOver && standing.validFrom < now && period.validFrom <= now;
    if (!canTakeOver) throw overlapRefusal(code, standing, zone);
    await endCalibration(transaction, context, standing.id, {
      as: "replaced",
      reason: `Replaced by ${values.reference}`,
    });
    period.validFrom = now;
    const next = await findOverlap(transaction, instrumentId, period);
    if (next) throw overlapRefusal(code, next, zone);
  }
  if (period.validUntil <= period.validFrom)
    throw invalid(`entries[${index}].validUntil`, "Valid until lies in the past.");
  await insertCalibration(transaction, code, {
    ...values,
    ...period,
    instrumentId,
    recordedBy: requirePerson(context).personId,
  });
  return { instrument: code, ...values, validFrom: fromDay, validUntil: untilDay };
}
