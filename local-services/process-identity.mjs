import { readFileSync } from "node:fs";

/** A process number alone is given again to others; with its start and the machine's boot it is not. */
export function identify(pid) {
  return { pid, startedAt: startOf(pid), boot: boot() };
}

export function isRunning(identity) {
  if (!identity || identity.boot !== boot()) return false;
  return answersSignals(identity.pid) && startOf(identity.pid) === identity.startedAt;
}

function answersSignals(pid) {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    return error.code === "EPERM";
  }
}

/** Fields of /proc/<pid>/stat after the command's name, or undefined where there is no such process. */
export function processFields(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, "utf8");
    return stat.slice(stat.lastIndexOf(")") + 2).split(" ");
  } catch {
    return undefined;
  }
}

/** Program and arguments, empty where there is no such process. */
export function commandLineOf(pid) {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, "utf8").split("\0").filter(Boolean);
  } catch {
    return [];
  }
}

function startOf(pid) {
  return processFields(pid)?.[19];
}

function boot() {
  try {
    return readFileSync("/proc/sys/kernel/random/boot_id", "utf8").trim();
  } catch {
    return undefined;
  }
}
