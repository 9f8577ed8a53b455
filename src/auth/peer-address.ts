import "server-only";
import { headers } from "next/headers";

/** Set on every request by start-up from the socket; what a client sends under this name is overwritten. */
export const peerHeader = "x-evenrail-peer";

export async function peerAddress(): Promise<string> {
  return (await headers()).get(peerHeader) ?? "unknown";
}
