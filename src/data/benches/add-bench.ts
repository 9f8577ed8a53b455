import "server-only";
import type { Transaction } from "../../db/client";
import { benchChannels, benches } from "../../db/schema/benches";
import type { InstrumentKind } from "../../db/vocabulary";
import type { Context } from "../access/actor";
import { write } from "../write";
import { addBenchInput } from "./inputs";
import { insertInstrument, refuseSecondOfBench } from "./internal";

const codeLetters: Record<InstrumentKind, string> = {
  cylinder: "CY",
  balance: "BA",
  "pressure gauge": "PG",
  thermometer: "TH",
  ohmmeter: "OM",
  "pulse timer": "PT",
  "drive supply": "DS",
};

/** A bench with its channels and instruments, whose codes are made of the bench's: CY-B2-04, PG-B2. */
export function addBench(context: Context, raw: unknown) {
  return write(context, "addBench", addBenchInput, raw, async ({ transaction, input, record }) => {
    const { idempotencyKey: _key, channelCount, channel, instruments, ...values } = input;
    const [added] = await transaction
      .insert(benches)
      .values(values)
      .returning({ benchId: benches.id })
      .catch(refuseSecondOfBench(values.code));
    const { benchId } = added!;
    const kind = values.collects === "volume" ? "cylinder" : "balance";
    for (const { channelId, number } of await insertChannels(transaction, benchId, channelCount)) {
      const code = `${codeLetters[kind]}-${values.code}-${String(number).padStart(2, "0")}`;
      await insertInstrument(transaction, { benchId, channelId }, { code, kind, ...channel });
    }
    for (const { present, ...own } of instruments.filter((each) => each.present)) {
      const code = `${codeLetters[own.kind]}-${values.code}`;
      await insertInstrument(transaction, { benchId, channelId: null }, { code, ...own });
    }
    await record({
      event: "bench added",
      noun: "bench",
      objectId: benchId,
      after: { ...values, channelCount },
    });
    return { benchId };
  });
}

async function insertChannels(transaction: Transaction, benchId: string, count: number) {
  const rows = Array.from({ length: count }, (_, index) => ({ benchId, number: index + 1 }));
  return transaction
    .insert(benchChannels)
    .values(rows)
    .returning({ channelId: benchChannels.id, number: benchChannels.number });
}
