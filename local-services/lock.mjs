import { linkSync, readFileSync, renameSync, rmSync, writeFileSync } from "node:fs";
import { setTimeout as pause } from "node:timers/promises";
import { guardedGroups, guardianIdentity, onGroupsChange } from "./guard.mjs";
import { stopGroup } from "./process-groups.mjs";
import { identify, isRunning } from "./process-identity.mjs";

/**
 * One holder at a time. `whenHeld` is asked while another process holds the lock; it throws, or returns to wait.
 * A lock of a process that is gone is taken over, after what that process had started has ended.
 */
export async function takeLock(path, { about, whenHeld }) {
  const content = () => ({
    launcher: identify(process.pid),
    guardian: guardianIdentity(),
    groups: guardedGroups(),
    about,
  });
  while (!claim(path, content())) {
    const holder = readLock(path);
    if (!holder) continue;
    if (isRunning(holder.launcher)) await whenHeld(holder.about);
    else if (!isCleanedUpByAnother(holder)) await takeAway(path, holder);
    await pause(100);
  }
  const forget = onGroupsChange(() => replace(path, content()));
  return {
    release() {
      forget();
      rmSync(path, { force: true });
    },
  };
}

/** What the running holder of a lock says about itself, or undefined when nobody holds it. */
export function holderOf(path) {
  const holder = readLock(path);
  return holder && isRunning(holder.launcher) ? holder.about : undefined;
}

function isCleanedUpByAnother({ guardian }) {
  return isRunning(guardian) && guardian.pid !== process.pid;
}

function readLock(path) {
  try {
    return JSON.parse(readFileSync(path, "utf8"));
  } catch (error) {
    if (error.code === "ENOENT" || error instanceof SyntaxError) return undefined;
    throw error;
  }
}

function claim(path, content) {
  const own = writeOwn(path, content);
  try {
    linkSync(own, path);
    return true;
  } catch (error) {
    if (error.code === "EEXIST") return false;
    throw error;
  } finally {
    rmSync(own, { force: true });
  }
}

function replace(path, content) {
  renameSync(writeOwn(path, content), path);
}

function writeOwn(path, content) {
  const own = `${path}.${process.pid}`;
  writeFileSync(own, JSON.stringify(content), { mode: 0o600 });
  return own;
}

/** Two may find the same stale lock: the one whose rename moved somebody's newer lock puts it back. */
async function takeAway(path, stale) {
  await Promise.all(stale.groups.filter(isRunning).map((group) => stopGroup(group.pid, group.ending)));
  const aside = `${path}.stale.${process.pid}`;
  try {
    renameSync(path, aside);
  } catch (error) {
    if (error.code === "ENOENT") return;
    throw error;
  }
  const moved = readLock(aside);
  if (moved && isRunning(moved.launcher)) linkSync(aside, path);
  rmSync(aside, { force: true });
}
