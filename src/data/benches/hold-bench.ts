import "server-only";
import { brokenConstraint } from "../../db/lost-connection";
import { benchHolds } from "../../db/schema/benches";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { refused } from "../access/errors";
import { write } from "../write";
import { holdBenchInput } from "./inputs";
import { lockBench } from "./internal";

/** Whoever doubts a bench holds it: it takes no cycle until the manager clears it. */
export function holdBench(context: Context, raw: unknown) {
  return write(context, "holdBench", holdBenchInput, raw, async ({ transaction, input, record }) => {
    const { benchId, reason } = input;
    const bench = await lockBench(transaction, benchId);
    if (bench.retiredAt) throw refused(`Bench ${bench.code} is retired.`);
    await transaction
      .insert(benchHolds)
      .values({ benchId, reason, heldBy: requirePerson(context).personId })
      .catch((error: unknown) => {
        if (brokenConstraint(error) === "bench_holds_one_open")
          throw refused(`Bench ${bench.code} is already on hold.`);
        throw error;
      });
    await record({ event: "bench held", noun: "bench", objectId: benchId, reason });
    return { benchId };
  });
}
