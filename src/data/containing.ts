import "server-only";
import { type SQL, sql } from "drizzle-orm";

/** `column` contains what was typed; `%`, `_` and `\` stand for themselves. */
export function containing(column: SQL, typed: string): SQL {
  const literal = typed
    .trim()
    .toLowerCase()
    .replace(/[\\%_]/g, "\\$&");
  return sql`${column} like ${`%${literal}%`}`;
}
