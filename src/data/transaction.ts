import "server-only";
import { sql } from "drizzle-orm";
import { database, type Transaction } from "../db/client";
import { isLostConnection, sqlState } from "../db/lost-connection";
import type { Context } from "./access/actor";
import { busy, isRefusal } from "./access/errors";

const attempts = 3;
const serializationFailures = new Set(["40001", "40P01"]);
const outOfPatience = new Set(["55P03", "57014", "53100", "53200", "53300"]);

/** Joins the context's transaction or opens one; only a serialization failure or deadlock is tried again. */
export async function inTransaction<Result>(
  context: Context,
  work: (transaction: Transaction) => Promise<Result>,
): Promise<Result> {
  if (context.transaction) return work(context.transaction);
  for (let attempt = 1; ; attempt++) {
    try {
      return await database().transaction(work);
    } catch (error) {
      if (attempt < attempts && serializationFailures.has(sqlState(error) ?? "")) await pause(attempt);
      else throw refusalFor(error);
    }
  }
}

/** What a failing database means to a person; everything else stays what it is. */
export function refusalFor(error: unknown): unknown {
  if (isRefusal(error)) return error;
  const state = sqlState(error) ?? "";
  if (isLostConnection(error))
    return busy("The record cannot be reached just now. Nothing was changed.", 5, error);
  if (serializationFailures.has(state) || outOfPatience.has(state))
    return busy("Others are working on the same record. Nothing was changed; please try again.", 2, error);
  return error;
}

function pause(attempt: number): Promise<void> {
  return new Promise((resolve) => setTimeout(resolve, attempt * 20 + Math.random() * 40));
}

/** The time of the record, for what is decided in code. */
export async function readRecordTime(transaction: Transaction): Promise<Date> {
  const [row] = await transaction.execute<{ now: string }>(sql`select record_now() as now`);
  return new Date(row!.now);
}
