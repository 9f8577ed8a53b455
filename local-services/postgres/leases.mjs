import { mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { guardLease } from "../guard.mjs";
import { takeLock } from "../lock.mjs";
import { identify, isRunning } from "../process-identity.mjs";
import { atEnd } from "../session.mjs";
import { claimFolder } from "./cluster-folder.mjs";
import { startServer, stopServer } from "./server.mjs";

/**
 * Several commands may use one server at the same time: each holds a lease, the first starts the server and the last
 * one to leave stops it. `first` tells a command that nobody else is there.
 */
export async function joinCluster(folder) {
  claimFolder(folder);
  const own = identify(process.pid);
  guardLease(folder);
  atEnd(() => leaveCluster(folder, own));
  return changing(folder, async () => {
    const first = livingLeases(folder).length === 0;
    writeFileSync(leasePath(folder, own), JSON.stringify(own));
    return { ...(await startServer(folder)), first };
  });
}

/** A server that died is started again at its place, where the application looks for it. */
export function reviveCluster(folder, port) {
  return changing(folder, () => startServer(folder, port));
}

export function leaveCluster(folder, holder) {
  return changing(folder, async () => {
    rmSync(leasePath(folder, holder), { force: true });
    if (livingLeases(folder).length === 0) await stopServer(folder);
  });
}

async function changing(folder, work) {
  const lock = await takeLock(join(folder, "changing.lock"), { whenHeld: () => {} });
  try {
    return await work();
  } finally {
    lock.release();
  }
}

function livingLeases(folder) {
  mkdirSync(leasesFolder(folder), { recursive: true });
  const paths = readdirSync(leasesFolder(folder)).map((name) => join(leasesFolder(folder), name));
  const [living, dead] = [[], []];
  for (const path of paths) (isRunning(JSON.parse(readFileSync(path, "utf8"))) ? living : dead).push(path);
  for (const path of dead) rmSync(path);
  return living;
}

function leasePath(folder, { pid }) {
  return join(leasesFolder(folder), String(pid));
}

function leasesFolder(folder) {
  return join(folder, "leases");
}
