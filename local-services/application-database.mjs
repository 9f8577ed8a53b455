import { existsSync, readFileSync } from "node:fs";
import { createDatabase, databaseExists, dropDatabase, renameDatabase } from "./postgres/databases.mjs";
import { inProject } from "./project.mjs";
import { migrate, seedDemo } from "./scripts.mjs";

export const applicationDatabase = "evenrail";
const unfinished = "evenrail_unfinished";

export async function ensureDatabase(cluster) {
  if (await databaseExists(cluster, applicationDatabase)) return;
  await createDatabase(cluster, applicationDatabase);
}

export async function migrateDatabase(cluster) {
  await ensureDatabase(cluster);
  await migrate(cluster, applicationDatabase);
}

/** Without a person in it, nobody has ever worked in this database. */
export async function isUntouched(cluster) {
  const rows = await cluster.run(applicationDatabase, "SELECT 'someone' FROM people LIMIT 1;");
  return rows.length === 0;
}

/** The demo is made aside and takes its place when it is whole, so that a start that is cut short leaves no half demo. */
export async function makeDemo(cluster, note) {
  await dropDatabase(cluster, unfinished);
  await createDatabase(cluster, unfinished);
  await migrate(cluster, unfinished);
  await seedDemo(cluster, unfinished, (text) => note(text.trim().split("\n").at(-1)));
  if (!(await isUntouched(cluster))) return "left out: somebody has set up the lab meanwhile";
  await dropDatabase(cluster, applicationDatabase);
  await renameDatabase(cluster, unfinished, applicationDatabase);
  return "a working month of an invented lab";
}

/** The demo's sign-ins, those that exist in the database. */
export async function demoSignIns(cluster) {
  const path = inProject("seed", "sign-ins.json");
  const listed = existsSync(path) ? JSON.parse(readFileSync(path, "utf8")) : [];
  const rows = await cluster.run(applicationDatabase, "SELECT email FROM people;");
  const known = new Set(rows.map(([email]) => email));
  return listed.filter(({ email }) => known.has(email));
}
