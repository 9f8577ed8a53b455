import "server-only";
import { migrate } from "drizzle-orm/postgres-js/migrator";
import { openDatabase } from "../db/client";

/** Brings the database to the newest schema as its owner; run again, it does nothing. */
const url = process.env.DATABASE_OWNER_URL;
if (!url) throw new Error("DATABASE_OWNER_URL is not set: the owner's address of the database to migrate");
const { sql, db } = openDatabase(url, 1);
try {
  await migrate(db, { migrationsFolder: "drizzle" });
} finally {
  await sql.end();
}
