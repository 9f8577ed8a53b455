import "server-only";
import type { Connection } from "../../db/client";
import { activity } from "../../db/schema/activity";
import type { Context } from "../access/actor";
import type { Happening } from "./events";

/** Adds a row to the activity record, in the transaction of the change that it tells of. */
export async function recordEvent(
  connection: Connection,
  context: Context,
  happening: Happening,
): Promise<void> {
  const { actor } = context;
  const isPerson = actor.kind === "person";
  await connection.insert(activity).values({
    personId: isPerson ? actor.personId : null,
    actor: actor.kind === "command" ? `command ${actor.name}` : actor.kind,
    roles: isPerson ? [...actor.roles] : [],
    event: happening.event,
    noun: happening.noun,
    objectId: happening.objectId ?? null,
    setId: happening.setId ?? null,
    before: happening.before ?? null,
    after: happening.after ?? null,
    reason: happening.reason ?? null,
    requestId: context.requestId,
  });
}
