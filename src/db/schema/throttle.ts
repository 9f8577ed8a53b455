import "server-only";
import { index, integer, pgTable, text } from "drizzle-orm/pg-core";
import { instant } from "../columns";

/** Wrong tries per account and per network peer, kept in the database so that a restart forgets nothing. */
export const throttleCounters = pgTable(
  "throttle_counters",
  {
    counter: text("counter").primaryKey(),
    windowStartedAt: instant("window_started_at").notNull(),
    count: integer("count").notNull(),
  },
  (table) => [index("throttle_counters_by_age").on(table.windowStartedAt)],
);
