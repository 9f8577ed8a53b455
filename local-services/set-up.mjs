import { isUntouched, makeDemo, migrateDatabase } from "./application-database.mjs";
import { Refusal } from "./failure.mjs";
import { checkNode } from "./node-version.mjs";
import { onlyOne, running } from "./only-one.mjs";
import { ensurePackages } from "./packages.mjs";
import { requirePort } from "./ports.mjs";
import { clusters, openCluster } from "./postgres/cluster.mjs";
import { isElsewhere } from "./postgres/cluster-folder.mjs";
import { keepServerRunning } from "./postgres/keep-server-running.mjs";
import { addressOf } from "./scripts.mjs";
import { say, step } from "./terminal.mjs";

const commands = { start: "npm start", dev: "npm run dev" };

/** What `npm start` and `npm run dev` share: a port, packages, PostgreSQL, the newest schema, a demo where nobody works. */
export async function setUp(command) {
  say("Evenrail");
  checkNode();
  const wanted = Number(process.env.PORT ?? 3000);
  await onlyOne(command, { address: addressOf(wanted) }, alreadyRunning(command));
  const port = await requirePort();
  await step("packages", () => ensurePackages(() => refuseWhileRunning(command)));
  const cluster = await step("PostgreSQL", () => openCluster(clusters.application), describeCluster);
  keepServerRunning(cluster);
  await step(
    "schema",
    () => migrateDatabase(cluster),
    () => "newest",
  );
  await step("demo", async (note) => ((await isUntouched(cluster)) ? makeDemo(cluster, note) : "not needed"));
  return { port, cluster };
}

function alreadyRunning(command) {
  return ({ address }) =>
    `${commands[command]} is already running for this project: open ${address}, or stop it first.`;
}

function refuseWhileRunning(own) {
  const other = Object.keys(commands).find((command) => command !== own && running(command));
  if (other) throw new Refusal(`The packages have to be installed anew: stop ${commands[other]} first.`);
}

function describeCluster({ port, folder }) {
  return `on port ${port}${isElsewhere(folder) ? `, records in ${folder}` : ""}`;
}
