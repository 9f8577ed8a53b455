import "server-only";
import { integer, pgTable, primaryKey, text } from "drizzle-orm/pg-core";

/** The last number given in a series of a year. A rolled-back check-in gives its number back. */
export const numberSeries = pgTable(
  "number_series",
  { series: text("series").notNull(), year: integer("year").notNull(), last: integer("last").notNull() },
  (table) => [primaryKey({ columns: [table.series, table.year] })],
);
