import "server-only";
import { setHolds } from "../../db/schema/sets";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { refused } from "../access/errors";
import { lockSet, requireOpenStage } from "../course";
import { write } from "../write";
import { holdSetInput } from "./inputs";

/** Work on the set rests until the hold is cleared; its stage stays as it is. */
export function holdSet(context: Context, raw: unknown) {
  return write(context, "holdSet", holdSetInput, raw, async ({ transaction, input, record }) => {
    const { setId, reason } = input;
    const set = await lockSet(transaction, setId);
    requireOpenStage(set);
    if (set.hold) throw refused(`Set ${set.number} is on hold already: ${set.hold.reason}`);
    await transaction.insert(setHolds).values({ setId, reason, heldBy: requirePerson(context).personId });
    await record({ event: "set held", noun: "set", objectId: setId, setId, reason });
    return { setId };
  });
}
