import { spawn } from "node:child_process";
import { identify } from "./process-identity.mjs";
import { inProject } from "./project.mjs";

/**
 * A launcher that is killed outright cannot clean up. A second process holds the other end of a pipe, notices, and
 * ends what the launcher had started.
 */
let guardian;
const groups = new Map();
const listeners = new Set();

export function startGuardian() {
  const script = inProject("local-services", "guardian.mjs");
  guardian = spawn(process.execPath, [script, JSON.stringify(identify(process.pid))], {
    cwd: "/",
    detached: true,
    stdio: ["pipe", "ignore", "ignore"],
  });
  guardian.on("error", () => {});
  guardian.stdin.on("error", () => {});
  guardian.unref();
}

export function guardianIdentity() {
  return guardian?.pid && identify(guardian.pid);
}

export function guardGroup(pid, ending) {
  const group = { ...identify(pid), ending };
  groups.set(pid, group);
  tell({ guardGroup: group });
}

export function forgetGroup(pid) {
  groups.delete(pid);
  tell({ forgetGroup: pid });
}

export function guardLease(clusterFolder) {
  tell({ guardLease: clusterFolder });
}

export function guardedGroups() {
  return [...groups.values()];
}

/** Locks write down the guarded groups, for the case that the guardian is killed too. */
export function onGroupsChange(listener) {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

export async function dismissGuardian() {
  if (!guardian?.pid || guardian.exitCode !== null) return;
  guardian.ref();
  await new Promise((resolve) => {
    guardian.once("exit", resolve);
    setTimeout(resolve, 2_000);
    tell({ done: true });
    guardian.stdin.end();
  });
}

function tell(message) {
  guardian?.stdin.write(`${JSON.stringify(message)}\n`);
  for (const listener of listeners) listener();
}
