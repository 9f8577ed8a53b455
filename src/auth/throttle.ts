import "server-only";
import { createHash } from "node:crypto";
import { eq, inArray, sql } from "drizzle-orm";
import { database } from "../db/client";
import { throttleCounters } from "../db/schema/throttle";

const windowSeconds = 15 * 60;
const wrongTries = { account: 10, peer: 30 };

export type Guesser = { account: string; peer: string };

function counters(guesser: Guesser) {
  const name = (kind: "account" | "peer") =>
    `${kind} ${createHash("sha256").update(guesser[kind]).digest("hex").slice(0, 32)}`;
  return { account: name("account"), peer: name("peer") };
}

const secondsLeft = sql<number>`ceil(extract(epoch from ${throttleCounters.windowStartedAt} - now()) + ${windowSeconds})::int`;

/** Seconds to wait before another try, or 0. The counters stand in the database: a restart forgets nothing. */
export async function secondsToWait(guesser: Guesser): Promise<number> {
  const names = counters(guesser);
  const rows = await database()
    .select({ counter: throttleCounters.counter, count: throttleCounters.count, left: secondsLeft })
    .from(throttleCounters)
    .where(inArray(throttleCounters.counter, Object.values(names)));
  const spent = rows.filter((row) => {
    const allowed = row.counter === names.account ? wrongTries.account : wrongTries.peer;
    return row.left > 0 && row.count >= allowed;
  });
  return Math.max(0, ...spent.map((row) => row.left));
}

export async function countWrongTry(guesser: Guesser): Promise<void> {
  const expired = sql`${throttleCounters.windowStartedAt} < now() - make_interval(secs => ${windowSeconds})`;
  for (const counter of Object.values(counters(guesser)).sort())
    await database()
      .insert(throttleCounters)
      .values({ counter, count: 1, windowStartedAt: sql`now()` })
      .onConflictDoUpdate({
        target: throttleCounters.counter,
        set: {
          count: sql`case when ${expired} then 1 else ${throttleCounters.count} + 1 end`,
          windowStartedAt: sql`case when ${expired} then now() else ${throttleCounters.windowStartedAt} end`,
        },
      });
}

/** A right password clears the account's counter; the peer's stays. */
export async function forgetWrongTries(guesser: Guesser): Promise<void> {
  await database()
    .delete(throttleCounters)
    .where(eq(throttleCounters.counter, counters(guesser).account));
}
