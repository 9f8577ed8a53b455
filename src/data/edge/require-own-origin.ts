import "server-only";
import { headers } from "next/headers";
import { settings } from "../../settings";
import { forbidden } from "../access/errors";

/** A change is asked for by our own pages only: the framework alone runs an action without or with a foreign Origin. */
export async function requireOwnOrigin(): Promise<void> {
  const sent = await headers();
  const origin = sent.get("origin");
  const own = origin ? origin === settings().APP_ORIGIN : sent.get("sec-fetch-site") === "same-origin";
  if (!own) throw forbidden();
}
