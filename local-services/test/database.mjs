import { clusters, openCluster } from "../postgres/cluster.mjs";
import { createDatabase, dropAll, dropDatabase } from "../postgres/databases.mjs";
import { migrate } from "../scripts.mjs";
import { atEnd } from "../session.mjs";

const prefix = "test_";
let opened;

/** The cluster of the tests, apart from the one that keeps records. */
export function testCluster() {
  opened ??= open();
  return opened;
}

async function open() {
  const cluster = await openCluster(clusters.tests);
  if (cluster.first) await dropAll(cluster, prefix);
  return cluster;
}

/** A migrated database that nobody else uses, dropped at the end. */
export async function makeTestDatabase(name) {
  const cluster = await testCluster();
  const database = `${prefix}${process.pid}_${name}`;
  await createDatabase(cluster, database);
  atEnd(() => dropDatabase(cluster, database));
  await migrate(cluster, database);
  return { cluster, database };
}
