import { accessSync, constants } from "node:fs";
import { delimiter, join } from "node:path";
import { Refusal } from "./failure.mjs";
import { runTool } from "./processes.mjs";

export const isRoot = process.getuid?.() === 0;

export function findProgram(name, folders = (process.env.PATH ?? "").split(delimiter)) {
  return folders.map((folder) => join(folder, name)).find(isExecutable);
}

export function isExecutable(path) {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}

/** Installs Debian packages where this user may, and otherwise says what an administrator has to run. */
export async function installSystemPackages(packages, purpose) {
  const wanted = packages.join(" ");
  if (!isRoot || !findProgram("apt-get"))
    throw new Refusal(
      `${purpose}: ask an administrator to run "apt-get install -y ${wanted}", then run this again.`,
    );
  try {
    await apt("install", ...packages);
  } catch (error) {
    if (/dpkg --configure -a/.test(error.output)) await runAsAdministrator(["dpkg", "--configure", "-a"]);
    await refresh(purpose, error);
    await apt("install", ...packages);
  }
}

async function refresh(purpose, reason) {
  try {
    await apt("update");
  } catch (error) {
    if (
      !/Could not resolve|Failed to fetch|Unable to connect|Temporary failure|Some index files/i.test(
        error.output,
      )
    )
      throw error;
    throw new Refusal(
      `${purpose}, and Debian's package server cannot be reached: connect this machine to the network.`,
      {
        cause: reason,
      },
    );
  }
}

function apt(verb, ...packages) {
  return runAsAdministrator(["apt-get", verb, "-y", "-q", "--no-install-recommends", ...packages]);
}

/** dpkg that is cut short leaves the machine's packages half configured, so Ctrl-C waits for it. */
function runAsAdministrator(command) {
  const env = { ...process.env, DEBIAN_FRONTEND: "noninteractive" };
  return runTool(command.slice(0, 2).join(" "), command, { env, interruptible: false });
}
