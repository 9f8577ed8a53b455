import "server-only";
import { database } from "../../db/client";
import type { Context } from "../access/actor";
import { recordEvent } from "./record-event";

/** A denial stands on its own connection: the change that was refused leaves nothing else behind. */
export async function recordDenial(context: Context, verb: string): Promise<void> {
  await recordEvent(database(), context, { event: "denied", noun: "verb", objectId: verb });
}
