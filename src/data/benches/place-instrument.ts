import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { recordNow } from "../../db/columns";
import { benchChannels, benchInstruments } from "../../db/schema/benches";
import { instruments } from "../../db/schema/instruments";
import type { Collection, InstrumentKind } from "../../db/vocabulary";
import type { Context } from "../access/actor";
import { invalid, notFound, refused } from "../access/errors";
import { write } from "../write";
import { ownInstrumentKinds, placeInstrumentInput } from "./inputs";
import { insertInstrument, lockBench } from "./internal";

type Place = { benchId: string; channelId: string | null; kind: InstrumentKind };

/** A new instrument takes a place on the bench; what stood there before is retired and stays on record. */
export function placeInstrument(context: Context, raw: unknown) {
  return write(
    context,
    "placeInstrument",
    placeInstrumentInput,
    raw,
    async ({ transaction, input, record }) => {
      const { idempotencyKey: _key, benchId, channelId, reason, ...values } = input;
      const bench = await lockBench(transaction, benchId);
      if (bench.retiredAt) throw refused(`Bench ${bench.code} is retired.`);
      const place = { benchId, channelId, kind: values.kind };
      await requirePlace(transaction, place, bench.collects);
      const before = await clearPlace(transaction, place);
      const instrumentId = await insertInstrument(transaction, { benchId, channelId }, values);
      await record({
        event: "instrument placed",
        noun: "instrument",
        objectId: instrumentId,
        before,
        after: { benchId, ...values },
        reason,
      });
      return { benchId, instrumentId };
    },
  );
}

async function requirePlace(
  transaction: Transaction,
  { benchId, channelId, kind }: Place,
  collects: Collection,
) {
  if (!channelId) {
    if (ownInstrumentKinds.every((own) => own !== kind))
      throw invalid("kind", "A cylinder or balance belongs to a channel.");
    return;
  }
  const [channel] = await transaction
    .select({ number: benchChannels.number })
    .from(benchChannels)
    .where(and(eq(benchChannels.id, channelId), eq(benchChannels.benchId, benchId)));
  if (!channel) throw notFound("channel");
  const fits = collects === "volume" ? "cylinder" : "balance";
  if (kind !== fits) throw invalid("kind", `A channel of this bench takes a ${fits}.`);
}

async function clearPlace(transaction: Transaction, { benchId, channelId, kind }: Place) {
  const [standing] = await transaction
    .select({ instrumentId: instruments.id, code: instruments.code })
    .from(benchInstruments)
    .innerJoin(instruments, eq(instruments.id, benchInstruments.instrumentId))
    .where(
      and(
        eq(benchInstruments.benchId, benchId),
        channelId ? eq(benchInstruments.channelId, channelId) : isNull(benchInstruments.channelId),
        eq(instruments.kind, kind),
        isNull(benchInstruments.untilAt),
      ),
    );
  if (!standing) return null;
  await transaction
    .update(benchInstruments)
    .set({ untilAt: recordNow })
    .where(and(eq(benchInstruments.instrumentId, standing.instrumentId), isNull(benchInstruments.untilAt)));
  await transaction
    .update(instruments)
    .set({ retiredAt: recordNow })
    .where(eq(instruments.id, standing.instrumentId));
  return standing;
}
