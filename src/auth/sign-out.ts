import "server-only";
import type { Context } from "../data/access/actor";
import { requirePerson } from "../data/access/authorize";
import { recordEvent } from "../data/audit/record-event";
import { database } from "../db/client";
import { endSession } from "./session";

export async function signOut(context: Context) {
  const { personId, sessionId } = requirePerson(context);
  const cookie = await endSession(sessionId);
  await recordEvent(database(), context, { event: "signed out", noun: "person", objectId: personId });
  return cookie;
}
