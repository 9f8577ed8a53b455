import "server-only";
import { eq } from "drizzle-orm";
import { recordNow } from "../../db/columns";
import { benches } from "../../db/schema/benches";
import type { Context } from "../access/actor";
import { changedFields } from "../audit/changed-fields";
import { requireSameVersion } from "../require-same-version";
import { write } from "../write";
import { editBenchInput } from "./inputs";
import { lockBench, refuseSecondOfBench } from "./internal";

const labels = {
  code: "Bench code",
  location: "Location",
  repeatability: "Repeatability",
  fluidId: "Fluid",
  driveVolts: "Drive voltage, V",
  driverKind: "Driver",
  periodMs: "Period, ms",
  retired: "Retired",
};

/** What a new cycle starts from. Cycles keep what they were recorded with. */
export function editBench(context: Context, raw: unknown) {
  return write(context, "editBench", editBenchInput, raw, async ({ transaction, input, record }) => {
    const { idempotencyKey: _key, benchId, version, ...values } = input;
    const { retired, ...plain } = values;
    const row = await lockBench(transaction, benchId);
    const stored = { ...row, retired: row.retiredAt !== null };
    requireSameVersion({ stored, version, values, labels });
    await transaction
      .update(benches)
      .set({
        ...plain,
        retiredAt: retired ? (row.retiredAt ?? recordNow) : null,
        version: version + 1,
      })
      .where(eq(benches.id, benchId))
      .catch(refuseSecondOfBench(plain.code));
    await record({
      event: "bench changed",
      noun: "bench",
      objectId: benchId,
      ...changedFields(stored, values),
    });
    return { benchId };
  });
}
