import "server-only";
import type { z } from "zod";
import type { Transaction } from "../db/client";
import type { Context } from "./access/actor";
import { authorize, type Grant } from "./access/authorize";
import type { WritingVerb } from "./access/permissions";
import type { Happening } from "./audit/events";
import { recordEvent } from "./audit/record-event";
import { answeredBefore, keepAnswer } from "./idempotency";
import { parseInput } from "./parse-input";
import { inTransaction } from "./transaction";

type Work<Input> = {
  transaction: Transaction;
  input: Input;
  grant: Grant;
  /** Tells the activity record what happened: exactly once in every write. */
  record: (happening: Happening) => Promise<void>;
};

/** The fixed order of every write: right to try, parse, transaction, the change, its record, the answer kept. */
export async function write<Schema extends z.ZodType, Result>(
  context: Context,
  verb: WritingVerb,
  schema: Schema,
  raw: unknown,
  change: (work: Work<z.output<Schema>>) => Promise<Result>,
): Promise<Result> {
  const grant = await authorize(context, verb);
  const input = parseInput(schema, raw);
  return inTransaction(context, async (transaction) => {
    const before = await answeredBefore<Result>(transaction, context, verb, input);
    if (before) return before.result;
    let recorded = 0;
    const record = (happening: Happening) => {
      recorded += 1;
      return recordEvent(transaction, context, happening);
    };
    const result = await change({ transaction, input, grant, record });
    if (recorded !== 1) throw new Error(`${verb} told the activity record ${recorded} times instead of once`);
    await keepAnswer(transaction, context, verb, input, result);
    return result;
  });
}
