import "server-only";
import { sql } from "drizzle-orm";
import { check, pgTable, text, uniqueIndex } from "drizzle-orm/pg-core";
import { between, instant, key, longest, measured, recordedAt, version } from "../columns";

export const fluids = pgTable(
  "fluids",
  {
    id: key("fluid_id"),
    name: text("name").notNull(),
    /** Both null for n-heptane, whose density comes from the published equation. */
    densityAt15GPerMl: measured("density_at_15_g_per_ml", 7, 6),
    expansionPerK: measured("expansion_per_k", 9, 8),
    /** Where the density and the expansion come from. */
    source: text("source").notNull(),
    retiredAt: instant("retired_at"),
    version: version(),
    createdAt: recordedAt("created_at"),
  },
  (table) => [
    uniqueIndex("fluids_one_per_name").on(sql`lower(${table.name})`),
    longest("fluids_name_length", table.name, 80),
    between("fluids_density", table.densityAt15GPerMl, 0.4, 1.2),
    between("fluids_expansion", table.expansionPerK, 0, 0.01),
    check(
      "fluids_density_with_expansion",
      sql`(${table.densityAt15GPerMl} is null) = (${table.expansionPerK} is null)`,
    ),
  ],
);
