import "server-only";
import { jsonb, pgTable, primaryKey, text } from "drizzle-orm/pg-core";
import { recordedAt } from "../columns";

/** One row for each accepted write: the same key again is answered with the first result. */
export const idempotencyKeys = pgTable(
  "idempotency_keys",
  {
    actor: text("actor").notNull(),
    verb: text("verb").notNull(),
    key: text("key").notNull(),
    inputHash: text("input_hash").notNull(),
    result: jsonb("result"),
    createdAt: recordedAt("created_at"),
  },
  (table) => [primaryKey({ columns: [table.actor, table.verb, table.key] })],
);
