import { mkdirSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";

export const projectFolder = dirname(dirname(fileURLToPath(import.meta.url)));

/** What runs here keeps its files in one folder that git does not see. */
export const localFolder = join(projectFolder, ".local");

export function inProject(...parts) {
  return join(projectFolder, ...parts);
}

export function localFile(name) {
  return join(localFolder, name);
}

export function makeLocalFolder() {
  mkdirSync(localFolder, { recursive: true });
}
