import "server-only";
import { sql } from "drizzle-orm";
import {
  type AnyPgColumn,
  boolean,
  index,
  pgTable,
  smallint,
  text,
  uniqueIndex,
  uuid,
} from "drizzle-orm/pg-core";
import { between, key, longest, oneOf, recordedAt } from "../columns";
import { injectorConditions, injectorStates } from "../vocabulary";
import { injectorModels } from "./models";
import { people } from "./people";
import { sets } from "./sets";

/** The thing itself, known again at its next visit when it has a serial. */
export const injectors = pgTable(
  "injectors",
  {
    id: key("injector_id"),
    injectorModelId: uuid("injector_model_id")
      .notNull()
      .references(() => injectorModels.id),
    serial: text("serial"),
    createdAt: recordedAt("created_at"),
  },
  (table) => [
    uniqueIndex("injectors_one_per_serial").on(table.injectorModelId, sql`upper(${table.serial})`),
    index("injectors_by_serial_parts").using("gin", sql`lower(${table.serial}) gin_trgm_ops`),
    longest("injectors_serial_length", table.serial, 60),
  ],
);

/** An injector's place in one visit. */
export const setInjectors = pgTable(
  "set_injectors",
  {
    id: key("set_injector_id"),
    setId: uuid("set_id")
      .notNull()
      .references(() => sets.id),
    injectorId: uuid("injector_id")
      .notNull()
      .references(() => injectors.id),
    position: smallint("position").notNull(),
    /** 26-0147/3; a replacement in the same place carries a letter: 26-0147/3B. */
    tag: text("tag").notNull(),
    marking: text("marking").notNull().default(""),
    condition: text("condition", { enum: injectorConditions }).notNull(),
    conditionNote: text("condition_note").notNull().default(""),
    state: text("state", { enum: injectorStates }).notNull().default("in set"),
    replacesId: uuid("replaces_id").references((): AnyPgColumn => setInjectors.id),
    /** True from check-in to hand-over: one injector is in one open set. */
    inHouse: boolean("in_house").notNull().default(true),
  },
  (table) => [
    uniqueIndex("set_injectors_one_per_tag").on(table.tag),
    uniqueIndex("set_injectors_one_per_position")
      .on(table.setId, table.position)
      .where(sql`${table.state} = 'in set'`),
    uniqueIndex("set_injectors_one_open_set").on(table.injectorId).where(sql`${table.inHouse}`),
    uniqueIndex("set_injectors_one_replacement").on(table.replacesId),
    index("set_injectors_by_injector").on(table.injectorId),
    between("set_injectors_position", table.position, 1, 48),
    oneOf("set_injectors_condition_known", table.condition, injectorConditions),
    oneOf("set_injectors_state_known", table.state, injectorStates),
    longest("set_injectors_marking_length", table.marking, 60),
    longest("set_injectors_note_length", table.conditionNote, 500),
  ],
);

export const injectorRejections = pgTable("injector_rejections", {
  setInjectorId: uuid("set_injector_id")
    .primaryKey()
    .references(() => setInjectors.id),
  reason: text("reason").notNull(),
  rejectedBy: uuid("rejected_by")
    .notNull()
    .references(() => people.id),
  rejectedAt: recordedAt("rejected_at"),
});
