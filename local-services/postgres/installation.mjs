import { execFileSync } from "node:child_process";
import { readdirSync } from "node:fs";
import { delimiter, join } from "node:path";
import { Refusal } from "../failure.mjs";
import { installSystemPackages, isExecutable } from "../system-packages.mjs";

const debianFolder = "/usr/lib/postgresql";
const oldestMajor = 15;
const programs = ["initdb", "pg_ctl", "postgres", "psql"];

/** Where this machine has PostgreSQL's programs: the newest, or the version a cluster was made with. */
export async function findInstallation(wantedMajor) {
  const found = search(wantedMajor);
  if (found) return found;
  const name = wantedMajor ? `postgresql-${wantedMajor}` : "postgresql";
  await installSystemPackages(
    [name],
    `${wantedMajor ? `PostgreSQL ${wantedMajor}` : "PostgreSQL"} is not installed`,
  );
  const installed = search(wantedMajor);
  if (installed) return installed;
  throw new Refusal(
    `PostgreSQL ${wantedMajor ?? `${oldestMajor} or newer`} is needed, and ${name} did not bring it.`,
  );
}

function search(wantedMajor) {
  return [...debianFolders(), ...(process.env.PATH ?? "").split(delimiter)]
    .filter((bin) => programs.every((program) => isExecutable(join(bin, program))))
    .map((bin) => ({ bin, major: majorOf(bin) }))
    .filter(({ major }) => (wantedMajor ? major === wantedMajor : major >= oldestMajor))
    .sort((a, b) => b.major - a.major)[0];
}

function debianFolders() {
  try {
    return readdirSync(debianFolder).map((version) => join(debianFolder, version, "bin"));
  } catch {
    return [];
  }
}

function majorOf(bin) {
  return Number(/(\d+)/.exec(execFileSync(join(bin, "postgres"), ["--version"], { encoding: "utf8" }))?.[1]);
}
