import "server-only";
import { asc, eq, sql } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { recordNow } from "../../db/columns";
import { benchChannels, benches, benchInstruments } from "../../db/schema/benches";
import { fluids } from "../../db/schema/fluids";
import type { Context } from "../access/actor";
import { notFound } from "../access/errors";
import { read } from "../read";
import { getBenchInput, ownInstrumentKinds } from "./inputs";
import { loadBenchHolds, loadEarlierInstruments } from "./load-bench-history";
import { loadCalibrations } from "./load-calibrations";
import { loadPlaced } from "./load-placed";
import { benchState, firstEnd } from "./status";
import type { BenchPage, BenchPlace } from "./types";

/** A bench with its places, instruments, calibrations and holds. The counter sees the status alone. */
export function getBench(context: Context, raw: unknown): Promise<BenchPage> {
  return read(context, "getBench", getBenchInput, raw, async ({ connection, input: { benchId }, grant }) => {
    const { code, location, retired, now, ...bench } = await selectBench(connection, benchId);
    const placed = await loadPlaced(connection, now, eq(benchInstruments.benchId, benchId));
    const holds = await loadBenchHolds(connection, benchId);
    const calibratedUntil = firstEnd(placed.map((instrument) => instrument.calibratedUntil));
    const state = benchState({ retired, held: holds.hold !== null, calibratedUntil }, now);
    const status = { benchId, code, location, state, calibratedUntil };
    if (grant.right === "status") return { ...status, detail: null };
    return {
      ...status,
      detail: {
        ...bench,
        ...holds,
        places: await placesOf(connection, { benchId, collects: bench.collects, placed }),
        earlierInstruments: await loadEarlierInstruments(connection, benchId),
      },
    };
  });
}

async function selectBench(connection: Connection, benchId: string) {
  const [found] = await connection
    .select({
      code: benches.code,
      location: benches.location,
      version: benches.version,
      collects: benches.collects,
      repeatability: benches.repeatability,
      fluidId: benches.fluidId,
      fluidName: fluids.name,
      driveVolts: benches.driveVolts,
      driverKind: benches.driverKind,
      periodMs: benches.periodMs,
      retired: sql<boolean>`${benches.retiredAt} is not null`,
      now: recordNow.mapWith(benches.createdAt),
    })
    .from(benches)
    .innerJoin(fluids, eq(fluids.id, benches.fluidId))
    .where(eq(benches.id, benchId));
  if (!found) throw notFound("bench");
  return found;
}

type Placed = Awaited<ReturnType<typeof loadPlaced>>;

async function placesOf(
  connection: Connection,
  { benchId, collects, placed }: { benchId: string; collects: "volume" | "mass"; placed: Placed },
): Promise<BenchPlace[]> {
  const channels = await connection
    .select({ channelId: benchChannels.id, channelNumber: benchChannels.number })
    .from(benchChannels)
    .where(eq(benchChannels.benchId, benchId))
    .orderBy(asc(benchChannels.number));
  const calibrations = await loadCalibrations(
    connection,
    placed.map((instrument) => instrument.instrumentId),
  );
  const instrumentAt = (fits: (each: Placed[number]) => boolean) => {
    const found = placed.find(fits);
    return found ? { ...found, calibrations: calibrations.get(found.instrumentId) ?? [] } : null;
  };
  return [
    ...channels.map((channel) => ({
      ...channel,
      kind: collects === "volume" ? ("cylinder" as const) : ("balance" as const),
      instrument: instrumentAt((each) => each.channelId === channel.channelId),
    })),
    ...ownInstrumentKinds.map((kind) => ({
      channelId: null,
      channelNumber: null,
      kind,
      instrument: instrumentAt((each) => each.channelId === null && each.kind === kind),
    })),
  ];
}
