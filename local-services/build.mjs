import { createHash } from "node:crypto";
import { existsSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { requireSpace } from "./disk.mjs";
import { runTool } from "./processes.mjs";
import { inProject, projectFolder } from "./project.mjs";

export const servedBuild = ".next";
export const testedBuild = ".next-test";

const sources = [
  "src",
  "public",
  "next.config.mjs",
  "postcss.config.mjs",
  "tsconfig.json",
  "package.json",
  "package-lock.json",
];

/** Builds when something that goes into a build has changed since the last one. */
export async function ensureBuild(folder, onOutput) {
  const stamp = inProject(folder, "built-from");
  const state = stateOfSources();
  if (existsSync(stamp) && readFileSync(stamp, "utf8") === state) return "up to date";
  requireSpace();
  rmSync(stamp, { force: true });
  await runTool("next build", [process.execPath, nextProgram, "build"], {
    env: buildEnvironment(folder),
    onOutput,
  });
  writeFileSync(stamp, state);
  return "built";
}

export const nextProgram = inProject("node_modules", "next", "dist", "bin", "next");

export function buildEnvironment(folder) {
  return {
    ...process.env,
    NODE_ENV: "production",
    NEXT_TELEMETRY_DISABLED: "1",
    ...(folder === servedBuild ? {} : { EVENRAIL_BUILD_FOLDER: folder }),
  };
}

function stateOfSources() {
  const hash = createHash("sha256").update(process.version);
  for (const path of sources.flatMap(filesBelow).sort())
    hash.update(path).update(readFileSync(join(projectFolder, path)));
  return hash.digest("hex");
}

function filesBelow(path) {
  const absolute = join(projectFolder, path);
  if (!existsSync(absolute)) return [];
  if (!statSync(absolute).isDirectory()) return [path];
  return readdirSync(absolute).flatMap((name) => filesBelow(join(path, name)));
}
