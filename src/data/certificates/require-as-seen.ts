import "server-only";
import type { Transaction } from "../../db/client";
import type { Stage } from "../../db/vocabulary";
import type { Context } from "../access/actor";
import { refused } from "../access/errors";
import { lockSet } from "../course";
import { getSetResults } from "../cycles";
import { getSet } from "../sets";
import { changesSince } from "./seen-records";

type Asked = { setId: string; version: number; seen: string; stages: readonly Stage[] };

/** The set with its results, locked, in one of the stages and just as the manager saw them; refused otherwise. */
export async function requireAsSeen(transaction: Transaction, context: Context, asked: Asked) {
  const { setId, version, seen, stages } = asked;
  const { stage, hold, ...locked } = await lockSet(transaction, setId);
  if (!stages.includes(stage)) throw refused(`Set ${locked.number} is ${stage}, not ${stages[0]}.`);
  if (hold) throw refused(`Set ${locked.number} is on hold.`, [`Take it off hold first: ${hold.reason}`]);
  const within = { ...context, transaction };
  const set = await getSet(within, { setId });
  const results = await getSetResults(within, { setId });
  const changes = changesSince(seen, results);
  if (set.version !== version) changes.push("The set's intake data were changed.");
  if (changes.length > 0)
    throw refused("This was changed after you opened the page. Look at it again before you decide.", changes);
  const { asFound, asLeft } = results;
  if (!asFound || !asLeft) throw refused("The set is not measured both as found and as left.");
  return { set, results: { ...results, asFound, asLeft } };
}

export type Reviewed = Awaited<ReturnType<typeof requireAsSeen>>;
