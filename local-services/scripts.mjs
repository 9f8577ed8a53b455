import { runTool } from "./processes.mjs";

export function addressOf(port) {
  return `http://127.0.0.1:${port}`;
}

/** What the served application gets: the runtime role, and nothing of the owner. */
export function appEnvironment(cluster, database, port) {
  const { DATABASE_OWNER_URL: _, ...env } = process.env;
  return {
    ...env,
    DATABASE_URL: cluster.urlOf("app", database),
    APP_ORIGIN: addressOf(port),
    PORT: String(port),
  };
}

/** What migrations, the demo and the tests get besides. */
export function ownerEnvironment(cluster, database, port = 3000) {
  return { ...appEnvironment(cluster, database, port), DATABASE_OWNER_URL: cluster.urlOf("owner", database) };
}

export function migrate(cluster, database) {
  return runScript("migrations", "src/commands/migrate.ts", cluster, database);
}

export function seedDemo(cluster, database, onOutput) {
  return runScript("demo", "seed/index.ts", cluster, database, onOutput);
}

function runScript(title, script, cluster, database, onOutput) {
  const command = [process.execPath, "--conditions=react-server", "--import", "tsx", script];
  return runTool(title, command, { env: ownerEnvironment(cluster, database), onOutput });
}
