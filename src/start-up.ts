import "server-only";
import { type IncomingMessage, Server } from "node:http";
import { peerHeader } from "./auth/peer-address";
import { settings } from "./settings";

export function prepareProcess(): void {
  settings();
  stampPeerAddresses();
}

/**
 * The framework hands on whatever forwarding headers a client sends. The throttle needs the address of the network
 * peer itself, so it is stamped on each request before anything reads it.
 */
function stampPeerAddresses(): void {
  const emit = Server.prototype.emit;
  Server.prototype.emit = function stamped(this: Server, event: string | symbol, ...parts: unknown[]) {
    if (event === "request") {
      const request = parts[0] as IncomingMessage;
      request.headers[peerHeader] = request.socket.remoteAddress ?? "unknown";
    }
    return emit.apply(this, [event, ...parts] as unknown as Parameters<typeof emit>);
  } as typeof emit;
}
