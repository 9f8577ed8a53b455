import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { cycleDrafts } from "../../db/schema/cycles";
import type { Context } from "../access/actor";
import { refused } from "../access/errors";
import { moveStage, requireOpenSet } from "../course";
import { write } from "../write";
import { getSetResults } from "./get-set-results";
import { sendToReviewInput } from "./inputs";
import { injectorsInSet } from "./internal";
import { missingForReview } from "./missing-for-review";

/** Hands the measured set to the manager, or says what is missing for that. */
export function sendToReview(context: Context, raw: unknown) {
  return write(context, "sendToReview", sendToReviewInput, raw, async ({ transaction, input, record }) => {
    const { setId } = input;
    const set = await requireOpenSet(transaction, setId);
    if (set.stage !== "as left")
      throw refused(`A set that is ${set.stage} is not sent to review.`, ["It is measured as left first."]);
    const results = await getSetResults({ ...context, transaction }, { setId });
    const missing = [
      ...(await openSheets(transaction, setId)),
      ...missingForReview(results, set.workAsked, await injectorsInSet(transaction, setId)),
    ];
    if (missing.length > 0) throw refused("The set is not ready for review.", missing);
    await moveStage(transaction, context, set, "in review");
    await record({
      event: "set sent to review",
      noun: "set",
      objectId: setId,
      setId,
      before: { stage: "as left" },
      after: {
        stage: "in review",
        asFoundRevisionId: results.asFound?.latest.cycleRevisionId,
        asLeftRevisionId: results.asLeft?.latest.cycleRevisionId,
      },
    });
    return { setId };
  });
}

async function openSheets(transaction: Transaction, setId: string): Promise<string[]> {
  const open = await transaction
    .select({ phase: cycleDrafts.phase })
    .from(cycleDrafts)
    .where(and(eq(cycleDrafts.setId, setId), isNull(cycleDrafts.closedAt)));
  return open.map(({ phase }) => `A sheet ${phase} is still open: record it or put it away.`);
}
