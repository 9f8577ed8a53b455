import "server-only";
import { setReviews } from "../../db/schema/certificates";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { moveStage } from "../course";
import { write } from "../write";
import { sendBackSetInput } from "./inputs";
import { requireAsSeen } from "./require-as-seen";

/** Back to the bench, with the reason in the course of the set. */
export function sendBackSet(context: Context, raw: unknown) {
  return write(context, "sendBackSet", sendBackSetInput, raw, async ({ transaction, input, record }) => {
    const { personId } = requirePerson(context);
    const { setId, reason } = input;
    const { set, results } = await requireAsSeen(transaction, context, { ...input, stages: ["in review"] });
    const revisions = {
      asFoundRevisionId: results.asFound.latest.cycleRevisionId,
      asLeftRevisionId: results.asLeft.latest.cycleRevisionId,
    };
    await transaction
      .insert(setReviews)
      .values({ setId, decision: "sent back", reason, reviewedBy: personId, ...revisions });
    await moveStage(transaction, context, set, "as left", reason);
    await record({
      event: "set sent back",
      noun: "set",
      objectId: setId,
      setId,
      before: { stage: "in review" },
      after: { stage: "as left", ...revisions },
      reason,
    });
    return { setId };
  });
}
