import { setTimeout as pause } from "node:timers/promises";
import { stopSignal } from "../session.mjs";
import { complain } from "../terminal.mjs";
import { reviveCluster } from "./leases.mjs";
import { runningServer } from "./server.mjs";

/** The application waits for a server that died and goes on when it is back, so somebody has to bring it back. */
export async function keepServerRunning({ folder, port }) {
  while (!stopSignal.aborted) {
    await pause(1_000, undefined, { signal: stopSignal }).catch(() => {});
    if (!stopSignal.aborted && !runningServer(folder)) await revive(folder, port);
  }
}

async function revive(folder, port) {
  try {
    await reviveCluster(folder, port);
    complain("PostgreSQL had stopped and was started again.");
  } catch (error) {
    complain(`PostgreSQL has stopped and does not start: ${error.message}.`);
  }
}
