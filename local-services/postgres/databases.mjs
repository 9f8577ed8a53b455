import { roles } from "./passwords.mjs";

export async function databaseExists(cluster, name) {
  const rows = await cluster.run("postgres", "SELECT 'yes' FROM pg_database WHERE datname = :'name';", {
    name,
  });
  return rows.length > 0;
}

/** An empty one, for the owner to migrate and the application to connect to, and nobody else. */
export async function createDatabase(cluster, name) {
  await cluster.run("postgres", creation, { name, ...roles });
}

export async function dropDatabase(cluster, name) {
  await cluster.run("postgres", `DROP DATABASE IF EXISTS :"name";`, { name });
}

export async function renameDatabase(cluster, from, to) {
  await cluster.run("postgres", `ALTER DATABASE :"from" RENAME TO :"to";`, { from, to });
}

/** Leftovers of runs that were killed; only safe while nobody else uses the cluster. */
export async function dropAll(cluster, prefix) {
  await cluster.run(
    "postgres",
    `SELECT format('DROP DATABASE %I', datname) FROM pg_database WHERE starts_with(datname, :'prefix') \\gexec`,
    { prefix },
  );
}

const creation = `
  CREATE DATABASE :"name" OWNER :"owner";
  REVOKE ALL ON DATABASE :"name" FROM PUBLIC;
  GRANT CONNECT ON DATABASE :"name" TO :"app";
`;
