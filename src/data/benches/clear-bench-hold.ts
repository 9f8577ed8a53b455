import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import { recordNow } from "../../db/columns";
import { benchHolds } from "../../db/schema/benches";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { refused } from "../access/errors";
import { write } from "../write";
import { clearBenchHoldInput } from "./inputs";
import { lockBench } from "./internal";

export function clearBenchHold(context: Context, raw: unknown) {
  return write(
    context,
    "clearBenchHold",
    clearBenchHoldInput,
    raw,
    async ({ transaction, input, record }) => {
      const { benchId, reason } = input;
      const bench = await lockBench(transaction, benchId);
      const cleared = await transaction
        .update(benchHolds)
        .set({
          clearedBy: requirePerson(context).personId,
          clearedAt: recordNow,
          clearedReason: reason,
        })
        .where(and(eq(benchHolds.benchId, benchId), isNull(benchHolds.clearedAt)))
        .returning({ reason: benchHolds.reason });
      if (cleared.length === 0) throw refused(`Bench ${bench.code} is not on hold.`);
      await record({
        event: "bench hold cleared",
        noun: "bench",
        objectId: benchId,
        before: { held: cleared[0]!.reason },
        reason,
      });
      return { benchId };
    },
  );
}
