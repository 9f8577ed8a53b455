import "server-only";
import { type Context, personIdOf } from "../data/access/actor";
import { recordEvent } from "../data/audit/record-event";
import { database } from "../db/client";
import { actorOf } from "./actor-of";

/** Nobody asked to be let in; whom the new token proved them to be has signed in. */
export async function recordSignIn(context: Context, token: string): Promise<void> {
  const actor = await actorOf(token);
  const objectId = personIdOf(actor);
  await recordEvent(database(), { ...context, actor }, { event: "signed in", noun: "person", objectId });
}
