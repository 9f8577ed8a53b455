import "server-only";
import { and, asc, eq, isNull, sql } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { recordNow } from "../../db/columns";
import { benchChannels, benches, benchHolds } from "../../db/schema/benches";
import type { Context } from "../access/actor";
import { groupBy } from "../group-by";
import { read } from "../read";
import { listBenchesInput } from "./inputs";
import { loadPlaced } from "./load-placed";
import { benchState, firstEnd } from "./status";
import type { BenchRow } from "./types";

/** Every bench with how it stands. The counter sees the status alone. */
export function listBenches(context: Context, raw?: unknown): Promise<BenchRow[]> {
  return read(context, "listBenches", listBenchesInput, raw, async ({ connection, input, grant }) => {
    const found = await selectBenches(connection, input.withRetired);
    const now = found[0]?.now ?? new Date(0);
    const placed = groupBy(await loadPlaced(connection, now), (instrument) => instrument.benchId);
    return found.map(({ now: _now, retired, ...bench }) => {
      const instruments = placed.get(bench.benchId) ?? [];
      const calibratedUntil = firstEnd(instruments.map((instrument) => instrument.calibratedUntil));
      const { benchId, code, location, ...detail } = bench;
      return {
        benchId,
        code,
        location,
        state: benchState({ retired, held: detail.holdReason !== null, calibratedUntil }, now),
        calibratedUntil,
        detail:
          grant.right === "status"
            ? null
            : {
                ...detail,
                outOfCalibration: instruments
                  .filter((instrument) => !instrument.calibratedUntil)
                  .map((instrument) => instrument.code),
              },
      };
    });
  });
}

function selectBenches(connection: Connection, withRetired: boolean) {
  return connection
    .select({
      benchId: benches.id,
      code: benches.code,
      location: benches.location,
      collects: benches.collects,
      channelCount: sql<number>`(select count(*)::int from ${benchChannels}
        where ${benchChannels.benchId} = ${benches.id})`,
      holdReason: benchHolds.reason,
      retired: sql<boolean>`${benches.retiredAt} is not null`,
      now: recordNow.mapWith(benches.createdAt),
    })
    .from(benches)
    .leftJoin(benchHolds, and(eq(benchHolds.benchId, benches.id), isNull(benchHolds.clearedAt)))
    .where(withRetired ? undefined : isNull(benches.retiredAt))
    .orderBy(sql`${benches.retiredAt} is not null`, asc(benches.code));
}
