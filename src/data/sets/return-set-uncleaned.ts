import "server-only";
import type { Context } from "../access/actor";
import { lockSet, moveStage, requireOpenStage } from "../course";
import { write } from "../write";
import { clearHold } from "./clear-hold";
import { returnSetUncleanedInput } from "./inputs";

/** The set goes back without a certificate. A hold ends with it, since that is how most holds end. */
export function returnSetUncleaned(context: Context, raw: unknown) {
  return write(
    context,
    "returnSetUncleaned",
    returnSetUncleanedInput,
    raw,
    async ({ transaction, input, record }) => {
      const { setId, reason } = input;
      const set = await lockSet(transaction, setId);
      requireOpenStage(set);
      if (set.hold) await clearHold(transaction, context, set.hold.holdId, reason);
      await moveStage(transaction, context, set, "returned uncleaned", reason);
      await record({
        event: "set returned uncleaned",
        noun: "set",
        objectId: setId,
        setId,
        before: { stage: set.stage, held: set.hold?.reason ?? null },
        reason,
      });
      return { setId };
    },
  );
}
