import "server-only";
import { sql } from "drizzle-orm";
import { date, index, pgTable, text, uniqueIndex, uuid } from "drizzle-orm/pg-core";
import { allOf, instant, key, longest, oneOf, recordedAt, version } from "../columns";
import { handOverWays, stages, workItems } from "../vocabulary";
import { customers } from "./customers";
import { injectorModels } from "./models";
import { people } from "./people";
import { toleranceClasses } from "./tolerance-classes";

export const sets = pgTable(
  "sets",
  {
    id: key("set_id"),
    /** As it is spoken and written on bags: 26-0147. */
    number: text("number").notNull(),
    customerId: uuid("customer_id")
      .notNull()
      .references(() => customers.id),
    injectorModelId: uuid("injector_model_id")
      .notNull()
      .references(() => injectorModels.id),
    toleranceClassId: uuid("tolerance_class_id")
      .notNull()
      .references(() => toleranceClasses.id),
    workAsked: text("work_asked", { enum: workItems }).array().notNull(),
    /** In the customer's words; printed on the certificate as theirs. */
    customerRequest: text("customer_request").notNull().default(""),
    internalNote: text("internal_note").notNull().default(""),
    promisedOn: date("promised_on", { mode: "string" }).notNull(),
    stage: text("stage", { enum: stages }).notNull().default("checked in"),
    version: version(),
    checkedInBy: uuid("checked_in_by")
      .notNull()
      .references(() => people.id),
    checkedInAt: recordedAt("checked_in_at"),
  },
  (table) => [
    uniqueIndex("sets_one_per_number").on(table.number),
    index("sets_by_number_parts").using("gin", sql`${table.number} gin_trgm_ops`),
    index("sets_by_stage").on(table.stage, table.promisedOn),
    index("sets_by_promise").on(table.promisedOn, table.id),
    index("sets_by_customer").on(table.customerId, table.checkedInAt),
    index("sets_by_arrival").on(table.checkedInAt, table.id),
    index("sets_by_model").on(table.injectorModelId),
    oneOf("sets_stage_known", table.stage, stages),
    allOf("sets_work_known", table.workAsked, workItems),
    longest("sets_request_length", table.customerRequest, 2000),
    longest("sets_note_length", table.internalNote, 4000),
  ],
);

/** The course of a set: each step with its person and time. */
export const setSteps = pgTable(
  "set_steps",
  {
    id: key("set_step_id"),
    setId: uuid("set_id")
      .notNull()
      .references(() => sets.id),
    fromStage: text("from_stage", { enum: stages }),
    toStage: text("to_stage", { enum: stages }).notNull(),
    reason: text("reason"),
    personId: uuid("person_id")
      .notNull()
      .references(() => people.id),
    at: recordedAt("at"),
  },
  (table) => [index("set_steps_by_set").on(table.setId, table.at)],
);

/** Which stage may follow which; the stage trigger reads it. */
export const stageMoves = pgTable(
  "stage_moves",
  {
    fromStage: text("from_stage", { enum: stages }).notNull(),
    toStage: text("to_stage", { enum: stages }).notNull(),
  },
  (table) => [uniqueIndex("stage_moves_once").on(table.fromStage, table.toStage)],
);

export const setHolds = pgTable(
  "set_holds",
  {
    id: key("set_hold_id"),
    setId: uuid("set_id")
      .notNull()
      .references(() => sets.id),
    reason: text("reason").notNull(),
    heldBy: uuid("held_by")
      .notNull()
      .references(() => people.id),
    heldAt: recordedAt("held_at"),
    clearedBy: uuid("cleared_by").references(() => people.id),
    clearedAt: instant("cleared_at"),
    clearedReason: text("cleared_reason"),
  },
  (table) => [
    uniqueIndex("set_holds_one_open").on(table.setId).where(sql`${table.clearedAt} is null`),
    index("set_holds_by_set").on(table.setId, table.heldAt),
  ],
);

export const handOvers = pgTable(
  "hand_overs",
  {
    setId: uuid("set_id")
      .primaryKey()
      .references(() => sets.id),
    takenBy: text("taken_by").notNull(),
    way: text("way", { enum: handOverWays }).notNull(),
    consignment: text("consignment").notNull().default(""),
    handedOverBy: uuid("handed_over_by")
      .notNull()
      .references(() => people.id),
    at: recordedAt("at"),
  },
  (table) => [
    oneOf("hand_overs_way_known", table.way, handOverWays),
    longest("hand_overs_taken_by_length", table.takenBy, 160),
  ],
);
