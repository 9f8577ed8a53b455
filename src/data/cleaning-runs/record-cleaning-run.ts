import "server-only";
import { cleaningRuns } from "../../db/schema/cleaning-runs";
import type { Stage } from "../../db/vocabulary";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { refused } from "../access/errors";
import { moveStage, requireOpenSet } from "../course";
import { write } from "../write";
import { recordCleaningRunInput } from "./inputs";

const cleanable: Stage[] = ["as found", "cleaning", "as left"];

/** A run through the bath. The set is cleaning from its first one on; after as left it goes back to cleaning. */
export function recordCleaningRun(context: Context, raw: unknown) {
  return write(
    context,
    "recordCleaningRun",
    recordCleaningRunInput,
    raw,
    async ({ transaction, input, record }) => {
      const { idempotencyKey: _key, ...run } = input;
      const set = await requireOpenSet(transaction, input.setId);
      if (!cleanable.includes(set.stage))
        throw refused(
          `A set that is ${set.stage} is not cleaned.`,
          set.stage === "checked in" ? ["It is measured as found first."] : [],
        );
      const [added] = await transaction
        .insert(cleaningRuns)
        .values({ ...run, recordedBy: requirePerson(context).personId })
        .returning({ id: cleaningRuns.id });
      if (set.stage !== "cleaning") await moveStage(transaction, context, set, "cleaning");
      await record({
        event: "cleaning run recorded",
        noun: "cleaning run",
        objectId: added!.id,
        setId: input.setId,
        after: run,
      });
      return { cleaningRunId: added!.id, setId: input.setId };
    },
  );
}
