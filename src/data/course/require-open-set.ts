import "server-only";
import type { Transaction } from "../../db/client";
import { isOpenStage } from "../../db/vocabulary";
import { refused } from "../access/errors";
import { type LockedSet, lockSet } from "./lock-set";

/** Refuses a set that is certified, returned or handed over; holds do not matter. */
export function requireOpenStage(set: LockedSet): void {
  if (isOpenStage(set.stage)) return;
  throw refused(`Set ${set.number} is ${set.stage}: nothing is added or changed from then on.`);
}

/** The set's row, locked, in a stage before certified and not on hold: it may be worked on. */
export async function requireOpenSet(transaction: Transaction, setId: string): Promise<LockedSet> {
  const set = await lockSet(transaction, setId);
  requireOpenStage(set);
  if (set.hold)
    throw refused(`Set ${set.number} is on hold.`, [`Take it off hold first: ${set.hold.reason}`]);
  return set;
}
