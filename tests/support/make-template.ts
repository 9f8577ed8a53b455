import { drizzle } from "drizzle-orm/postgres-js";
import { migrate } from "drizzle-orm/postgres-js/migrator";
import { addressOf, asOwner, ownerAddress } from "./databases";

/** One migrated database that every suite copies. Workers learn its name from the environment. */
export default async function makeTemplate() {
  process.env.EVENRAIL_TEST_RUN = String(process.pid);
  const template = `test_${process.pid}_template`;
  const maintenance = ownerAddress();
  await asOwner((sql) => sql`create database ${sql(template)}`, maintenance);
  await asOwner(
    (sql) => migrate(drizzle(sql), { migrationsFolder: "drizzle" }),
    addressOf(maintenance, template),
  );
  return () => asOwner((sql) => sql`drop database if exists ${sql(template)}`, maintenance);
}
