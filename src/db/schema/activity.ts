import "server-only";
import { bigint, index, jsonb, pgTable, text, uuid } from "drizzle-orm/pg-core";
import { recordedAt } from "../columns";

/**
 * The activity record: one row for every change, refusal, sign-in and export, chained by hash.
 * position, at, previous_hash and hash are filled by a trigger under a lock, so the counter has no gaps.
 */
export const activity = pgTable(
  "activity",
  {
    position: bigint("position", { mode: "number" }).primaryKey().default(0),
    at: recordedAt("at"),
    /** Null when a job or nobody signed in acted. No contact data stands in this table. */
    personId: uuid("person_id"),
    actor: text("actor").notNull(),
    roles: text("roles").array().notNull(),
    event: text("event").notNull(),
    noun: text("noun").notNull(),
    objectId: text("object_id"),
    /** The set that the event belongs to, for its course. */
    setId: uuid("set_id"),
    before: jsonb("before"),
    after: jsonb("after"),
    reason: text("reason"),
    requestId: text("request_id").notNull(),
    previousHash: text("previous_hash").notNull().default(""),
    hash: text("hash").notNull().default(""),
  },
  (table) => [
    index("activity_by_object").on(table.noun, table.objectId, table.position),
    index("activity_by_set").on(table.setId, table.position),
    index("activity_by_person").on(table.personId, table.position),
    index("activity_by_time").on(table.at),
  ],
);
