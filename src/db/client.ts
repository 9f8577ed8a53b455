import "server-only";
import { drizzle } from "drizzle-orm/postgres-js";
import type postgres from "postgres";
import { settings } from "../settings";
import { connect } from "./connect";

export type Database = ReturnType<typeof openDatabase>["db"];
export type Transaction = Parameters<Parameters<Database["transaction"]>[0]>[0];
export type Connection = Database | Transaction;

export function openDatabase(url: string, max: number) {
  const sql = connect(url, max);
  return { sql, db: drizzle(sql) };
}

// One pool for the process; the development server reloads modules, so it hangs on globalThis.
const shared = globalThis as typeof globalThis & { evenrailDatabase?: { sql: postgres.Sql; db: Database } };

function opened() {
  shared.evenrailDatabase ??= openDatabase(settings().DATABASE_URL, settings().DATABASE_POOL);
  return shared.evenrailDatabase;
}

export function database(): Database {
  return opened().db;
}

export async function closeDatabase(): Promise<void> {
  await shared.evenrailDatabase?.sql.end({ timeout: 5 });
  shared.evenrailDatabase = undefined;
}
