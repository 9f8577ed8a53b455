import { readdirSync } from "node:fs";
import { setTimeout as pause } from "node:timers/promises";
import { processFields } from "./process-identity.mjs";

/** Asks a process group to end, waits, then makes it. Resolves when nothing of it is left. */
export async function stopGroup(group, { signal, patienceMs }) {
  send(group, signal);
  if (await groupEnds(group, patienceMs)) return;
  send(group, "SIGKILL");
  await groupEnds(group, 5_000);
}

function send(group, signal) {
  try {
    process.kill(-group, signal);
  } catch (error) {
    if (error.code !== "ESRCH") throw error;
  }
}

async function groupEnds(group, patienceMs) {
  for (const deadline = Date.now() + patienceMs; Date.now() < deadline; await pause(50)) {
    if (!groupLives(group)) return true;
  }
  return !groupLives(group);
}

/** A zombie still answers signals where nobody collects it, so the states are read too. */
function groupLives(group) {
  try {
    process.kill(-group, 0);
  } catch (error) {
    return error.code === "EPERM";
  }
  const members = processNumbers()
    .map(processFields)
    .filter((fields) => Number(fields?.[2]) === group);
  return members.length === 0 ? false : members.some(([state]) => state !== "Z" && state !== "X");
}

function processNumbers() {
  return readdirSync("/proc").filter((name) => /^\d+$/.test(name));
}
