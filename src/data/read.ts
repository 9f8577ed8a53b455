import "server-only";
import type { z } from "zod";
import { type Connection, database } from "../db/client";
import type { Context } from "./access/actor";
import { authorize, type Grant } from "./access/authorize";
import type { ReadingVerb } from "./access/permissions";
import { parseInput } from "./parse-input";
import { refusalFor } from "./transaction";

/** The fixed order of every read: right to try, parse, query within the grant. */
export async function read<Schema extends z.ZodType, Result>(
  context: Context,
  verb: ReadingVerb,
  schema: Schema,
  raw: unknown,
  query: (work: { connection: Connection; input: z.output<Schema>; grant: Grant }) => Promise<Result>,
): Promise<Result> {
  const grant = await authorize(context, verb);
  const input = parseInput(schema, raw);
  try {
    return await query({ connection: context.transaction ?? database(), input, grant });
  } catch (error) {
    throw refusalFor(error);
  }
}
