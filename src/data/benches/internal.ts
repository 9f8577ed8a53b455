import "server-only";
import { eq } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { brokenConstraint } from "../../db/lost-connection";
import { benches, benchInstruments } from "../../db/schema/benches";
import { instruments } from "../../db/schema/instruments";
import type { InstrumentKind } from "../../db/vocabulary";
import { invalid, notFound } from "../access/errors";

/** The bench's row, locked until the transaction ends. */
export async function lockBench(transaction: Transaction, benchId: string) {
  const [found] = await transaction.select().from(benches).where(eq(benches.id, benchId)).for("update");
  if (!found) throw notFound("bench");
  return found;
}

type NewInstrument = {
  code: string;
  kind: InstrumentKind;
  rangeHigh: number;
  division: number;
  maker?: string;
  serial?: string;
  intervalMonths?: number;
};

/** An instrument and the place it takes on a bench. */
export async function insertInstrument(
  transaction: Transaction,
  place: { benchId: string; channelId: string | null },
  values: NewInstrument,
): Promise<string> {
  const [added] = await transaction
    .insert(instruments)
    .values(values)
    .returning({ instrumentId: instruments.id })
    .catch(refuseSecondOfCode(values.code));
  const { instrumentId } = added!;
  await transaction.insert(benchInstruments).values({ ...place, instrumentId });
  return instrumentId;
}

export function refuseSecondOfCode(code: string) {
  return (error: unknown): never => {
    if (brokenConstraint(error) === "instruments_one_per_code")
      throw invalid("code", `There is already an instrument ${code}.`);
    throw error;
  };
}

export function refuseSecondOfBench(code: string) {
  return (error: unknown): never => {
    if (brokenConstraint(error) === "benches_one_per_code")
      throw invalid("code", `There is already a bench ${code}.`);
    throw error;
  };
}
