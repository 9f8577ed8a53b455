import "server-only";
import { eq } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { cleaningRuns } from "../../db/schema/cleaning-runs";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { forbidden, notFound, refused } from "../access/errors";
import { requireOpenSet } from "../course";
import { write } from "../write";
import { correctCleaningRunInput } from "./inputs";

/** A new entry that names the one it corrects, by who recorded that, before release. */
export function correctCleaningRun(context: Context, raw: unknown) {
  return write(
    context,
    "correctCleaningRun",
    correctCleaningRunInput,
    raw,
    async ({ transaction, input, record }) => {
      const { idempotencyKey: _key, cleaningRunId, reason, ...run } = input;
      const { personId } = requirePerson(context);
      const wrong = await requireLatestEntry(transaction, cleaningRunId, personId);
      const { setId } = wrong;
      const [added] = await transaction
        .insert(cleaningRuns)
        .values({ ...run, setId, correctsId: cleaningRunId, correctionReason: reason, recordedBy: personId })
        .returning({ id: cleaningRuns.id });
      await record({
        event: "cleaning run corrected",
        noun: "cleaning run",
        objectId: added!.id,
        setId,
        before: { cleaningRunId },
        after: run,
        reason,
      });
      return { cleaningRunId: added!.id, setId };
    },
  );
}

async function requireLatestEntry(transaction: Transaction, cleaningRunId: string, personId: string) {
  const [run] = await transaction.select().from(cleaningRuns).where(eq(cleaningRuns.id, cleaningRunId));
  if (!run) throw notFound("cleaning run");
  await requireOpenSet(transaction, run.setId);
  if (run.recordedBy !== personId) throw forbidden();
  const [later] = await transaction
    .select({ id: cleaningRuns.id })
    .from(cleaningRuns)
    .where(eq(cleaningRuns.correctsId, cleaningRunId));
  if (later) throw refused("This run was corrected already. Correct the newer entry.");
  return run;
}
