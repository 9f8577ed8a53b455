import { createHash } from "node:crypto";
import { existsSync, mkdirSync, readdirSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { Refusal } from "../failure.mjs";
import { localFolder, projectFolder } from "../project.mjs";
import { isRoot } from "../system-packages.mjs";
import { canReach, serverAccount } from "./account.mjs";

const marker = "made-by-evenrail";

/** The folder of a cluster: its data, its passwords, who uses it. Below the project unless the server cannot go there. */
export function clusterFolder(name) {
  const inside = join(localFolder, name);
  if (!isRoot || canReach(serverAccount(), projectFolder)) return inside;
  const project = createHash("sha256").update(projectFolder).digest("hex").slice(0, 12);
  return join("/var/lib/postgresql", `evenrail-${project}`, name);
}

export function isElsewhere(folder) {
  return !folder.startsWith(localFolder);
}

/** Makes the folder, or takes it only when it is one of ours. */
export function claimFolder(folder) {
  mkdirSync(folder, { recursive: true });
  const mark = join(folder, marker);
  if (existsSync(mark)) return;
  if (readdirSync(folder).length > 0)
    throw new Refusal(
      `${folder} holds files that Evenrail did not put there: move them away, then run this again.`,
    );
  writeFileSync(mark, `${projectFolder}\n`);
}

export function dataFolder(folder) {
  return join(folder, "data");
}
