import { existsSync, readFileSync, renameSync, rmSync } from "node:fs";
import { join } from "node:path";
import { freePort } from "../ports.mjs";
import { commandLineOf } from "../process-identity.mjs";
import { runTool } from "../processes.mjs";
import { ownerAccount } from "./account.mjs";
import { dataFolder } from "./cluster-folder.mjs";
import { createCluster } from "./create-cluster.mjs";

/** Loopback only, and everything that makes a written record safe switched on. */
const fixedSettings = {
  listen_addresses: "127.0.0.1",
  unix_socket_directories: "",
  fsync: "on",
  full_page_writes: "on",
  synchronous_commit: "on",
  timezone: "UTC",
  log_timezone: "UTC",
  max_connections: "200",
};
const attempts = 5;

/** The port of the running server of this folder; starts it when it does not run. */
export async function startServer(folder, wantedPort) {
  const { bin } = await createCluster(folder);
  const running = runningServer(folder);
  if (running) return running;
  removeStalePidFile(folder);
  for (let attempt = 1; ; attempt++) {
    try {
      return await startOn(wantedPort ?? (await freePort()), bin, folder);
    } catch (error) {
      const log = readLog(folder);
      if (attempt === attempts || !/Address already in use/.test(log)) throw withLog(error, log);
    }
  }
}

export async function stopServer(folder) {
  if (!runningServer(folder)) return;
  const { bin } = await createCluster(folder);
  await pgCtl(bin, folder, ["stop", "--mode=fast"]);
}

/** Its process and port, or undefined. */
export function runningServer(folder) {
  const [pid, , , port] = pidFileLines(folder).map(Number);
  return pid && commandLineOf(pid).includes(dataFolder(folder)) ? { pid, port } : undefined;
}

async function startOn(port, bin, folder) {
  const settings = Object.entries({ ...fixedSettings, port }).map(([name, value]) => `-c ${name}='${value}'`);
  keepLastLog(folder);
  await pgCtl(bin, folder, ["start", `--log=${logPath(folder)}`, `--options=${settings.join(" ")}`]);
  return runningServer(folder);
}

/** Never cut short: a server that starts after its starter has gone would belong to nobody. */
function pgCtl(bin, folder, [verb, ...rest]) {
  const data = dataFolder(folder);
  const command = [join(bin, "pg_ctl"), verb, `--pgdata=${data}`, "--wait", "--timeout=60", ...rest];
  return runTool(`pg_ctl ${verb}`, command, { cwd: "/", account: ownerAccount(data), interruptible: false });
}

function pidFileLines(folder) {
  try {
    return readFileSync(join(dataFolder(folder), "postmaster.pid"), "utf8").split("\n");
  } catch (error) {
    if (error.code === "ENOENT") return [];
    throw error;
  }
}

/** A pid file can outlive its server, and its number be another program's by now; PostgreSQL would then not start. */
function removeStalePidFile(folder) {
  const pid = Number(pidFileLines(folder)[0]);
  const [program] = pid ? commandLineOf(pid) : [];
  if (program && !/postgres/.test(program)) rmSync(join(dataFolder(folder), "postmaster.pid"));
}

function logPath(folder) {
  return join(dataFolder(folder), "server.log");
}

function keepLastLog(folder) {
  if (existsSync(logPath(folder))) renameSync(logPath(folder), `${logPath(folder)}.last`);
}

function readLog(folder) {
  return existsSync(logPath(folder)) ? readFileSync(logPath(folder), "utf8") : "";
}

function withLog(error, log) {
  if (error.output !== undefined) error.output += `\n${log}`;
  return error;
}
