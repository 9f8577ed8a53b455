import "server-only";
import { sql } from "drizzle-orm";
import {
  type AnyPgColumn,
  boolean,
  check,
  index,
  pgTable,
  text,
  uniqueIndex,
  uuid,
} from "drizzle-orm/pg-core";
import { allOf, between, key, longest, measured, recordedAt } from "../columns";
import { renewableParts } from "../vocabulary";
import { people } from "./people";
import { sets } from "./sets";

export const cleaningRuns = pgTable(
  "cleaning_runs",
  {
    id: key("cleaning_run_id"),
    setId: uuid("set_id")
      .notNull()
      .references(() => sets.id),
    bath: text("bath").notNull(),
    detergentBatch: text("detergent_batch").notNull(),
    minutes: measured("minutes", 6, 1).notNull(),
    temperatureC: measured("temperature_c", 5, 1).notNull(),
    backFlushed: boolean("back_flushed").notNull(),
    partsRenewed: text("parts_renewed", { enum: renewableParts }).array().notNull(),
    note: text("note").notNull().default(""),
    correctsId: uuid("corrects_id").references((): AnyPgColumn => cleaningRuns.id),
    correctionReason: text("correction_reason"),
    recordedBy: uuid("recorded_by")
      .notNull()
      .references(() => people.id),
    recordedAt: recordedAt("recorded_at"),
  },
  (table) => [
    index("cleaning_runs_by_set").on(table.setId, table.recordedAt),
    uniqueIndex("cleaning_runs_one_correction").on(table.correctsId),
    check(
      "cleaning_runs_reason",
      sql`${table.correctsId} is null or char_length(${table.correctionReason}) > 0`,
    ),
    between("cleaning_runs_minutes", table.minutes, 0.5, 600),
    between("cleaning_runs_temperature", table.temperatureC, 5, 95),
    allOf("cleaning_runs_parts_known", table.partsRenewed, renewableParts),
    longest("cleaning_runs_bath_length", table.bath, 60),
    longest("cleaning_runs_batch_length", table.detergentBatch, 60),
    longest("cleaning_runs_note_length", table.note, 2000),
  ],
);
