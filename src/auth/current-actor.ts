import "server-only";
import { randomUUID } from "node:crypto";
import { cookies, headers } from "next/headers";
import { cache } from "react";
import type { Context } from "../data/access/actor";
import { requireOwnOrigin } from "../data/edge/require-own-origin";
import { actorOf } from "./actor-of";
import { lucia } from "./session";

/** Who asks. Read anew in every request, so that a change of role or a sign-out holds at once. */
export const currentContext = cache(async function currentContext(): Promise<Context> {
  const requestId = (await headers()).get("x-request-id") ?? randomUUID();
  const token = (await cookies()).get(lucia().sessionCookieName)?.value;
  return { actor: token ? await actorOf(token) : { kind: "anonymous" }, requestId };
});

/** For actions and handlers that change something: asked for by our own pages only. */
export async function currentWriter(): Promise<Context> {
  await requireOwnOrigin();
  return currentContext();
}
