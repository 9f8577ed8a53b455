import { delimiter } from "node:path";
import { applicationDatabase, ensureDatabase } from "./application-database.mjs";
import { Refusal } from "./failure.mjs";
import { ensurePackages } from "./packages.mjs";
import { clusters, openCluster } from "./postgres/cluster.mjs";
import { startService } from "./processes.mjs";
import { inProject, makeLocalFolder } from "./project.mjs";
import { ownerEnvironment } from "./scripts.mjs";
import { runSession, stopSignal } from "./session.mjs";
import { makeTestDatabase } from "./test/database.mjs";

/**
 * Runs a command within a database: the one that DATABASE_URL names where it is set, else the application's, else with
 * --scratch a migrated one of its own that is dropped afterwards.
 */
const [scratch, ...command] =
  process.argv[2] === "--scratch" ? process.argv.slice(2) : [undefined, ...process.argv.slice(2)];

await runSession(async () => {
  if (command.length === 0)
    throw new Refusal("Usage: node local-services/with-database.mjs [--scratch] COMMAND…");
  return run(await environment());
});

async function environment() {
  if (process.env.DATABASE_URL && !scratch) return process.env;
  makeLocalFolder();
  await ensurePackages();
  if (scratch) {
    const { cluster, database } = await makeTestDatabase("scratch");
    return ownerEnvironment(cluster, database);
  }
  const cluster = await openCluster(clusters.application);
  await ensureDatabase(cluster);
  return ownerEnvironment(cluster, applicationDatabase);
}

async function run(env) {
  const programs = [inProject("node_modules", ".bin"), env.PATH].join(delimiter);
  const service = startService(command, { env: { ...env, PATH: programs }, stdio: "inherit" });
  stopSignal.addEventListener("abort", service.stop, { once: true });
  const { code, error } = await service.ended;
  if (error) throw error;
  stopSignal.throwIfAborted();
  return code ?? 1;
}
