import "server-only";
import type { Context } from "../access/actor";
import { refused } from "../access/errors";
import { lockSet } from "../course";
import { write } from "../write";
import { clearHold } from "./clear-hold";
import { clearSetHoldInput } from "./inputs";

export function clearSetHold(context: Context, raw: unknown) {
  return write(context, "clearSetHold", clearSetHoldInput, raw, async ({ transaction, input, record }) => {
    const { setId, reason } = input;
    const set = await lockSet(transaction, setId);
    if (!set.hold) throw refused(`Set ${set.number} is not on hold.`);
    await clearHold(transaction, context, set.hold.holdId, reason);
    await record({
      event: "set hold cleared",
      noun: "set",
      objectId: setId,
      setId,
      before: { held: set.hold.reason },
      reason,
    });
    return { setId };
  });
}
