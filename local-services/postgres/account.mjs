import { spawnSync } from "node:child_process";
import { statSync } from "node:fs";
import { Refusal } from "../failure.mjs";
import { isRoot } from "../system-packages.mjs";

/** PostgreSQL refuses to run as root; root runs it as the account Debian made for it. Everyone else runs it directly. */
export function serverAccount() {
  if (!isRoot) return undefined;
  return accountOf("postgres");
}

/** A cluster that exists is run by the account that owns its data. */
export function ownerAccount(dataFolder) {
  const { uid, gid } = statSync(dataFolder);
  if (!isRoot) {
    if (uid === process.getuid()) return undefined;
    throw new Refusal(
      `The records in ${dataFolder} belong to another user: run this as the user who started Evenrail first.`,
    );
  }
  if (uid === 0)
    throw new Refusal(
      `${dataFolder} belongs to root, and PostgreSQL does not run as root: give it back to its owner.`,
    );
  return { uid, gid };
}

export function canReach(account, folder) {
  return spawnSync("test", ["-x", folder], { cwd: "/", ...account }).status === 0;
}

function accountOf(name) {
  const ids = ["-u", "-g"].map((flag) => spawnSync("id", [flag, name], { encoding: "utf8" }));
  if (ids.some(({ status }) => status !== 0))
    throw new Refusal(
      `PostgreSQL does not run as root, and there is no user "${name}": add one, or start as another user.`,
    );
  const [uid, gid] = ids.map(({ stdout }) => Number(stdout));
  return { uid, gid };
}
