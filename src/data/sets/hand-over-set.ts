import "server-only";
import { eq } from "drizzle-orm";
import { setInjectors } from "../../db/schema/injectors";
import { handOvers } from "../../db/schema/sets";
import type { Stage } from "../../db/vocabulary";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { refused } from "../access/errors";
import { lockSet, moveStage } from "../course";
import { write } from "../write";
import { handOverSetInput } from "./inputs";

const leaving: readonly Stage[] = ["certified", "returned uncleaned"];

/** The set leaves, once; its injectors may be checked in again from then on. */
export function handOverSet(context: Context, raw: unknown) {
  return write(context, "handOverSet", handOverSetInput, raw, async ({ transaction, input, record }) => {
    const { idempotencyKey: _key, ...handOver } = input;
    const { setId } = handOver;
    const set = await lockSet(transaction, setId);
    if (set.stage === "handed over") throw refused(`Set ${set.number} is handed over already.`);
    if (!leaving.includes(set.stage))
      throw refused(`Set ${set.number} is ${set.stage} and cannot leave yet.`, [
        "It leaves once it is certified, or returned uncleaned with a reason.",
      ]);
    await transaction
      .insert(handOvers)
      .values({ ...handOver, handedOverBy: requirePerson(context).personId });
    await moveStage(transaction, context, set, "handed over");
    await transaction.update(setInjectors).set({ inHouse: false }).where(eq(setInjectors.setId, setId));
    // Who took it is contact data and stays out of the activity record.
    await record({
      event: "set handed over",
      noun: "set",
      objectId: setId,
      setId,
      before: { stage: set.stage },
      after: { way: handOver.way },
    });
    return { setId };
  });
}
