import "server-only";
import { sql } from "drizzle-orm";
import { boolean, index, pgTable, primaryKey, text, uniqueIndex, uuid } from "drizzle-orm/pg-core";
import { instant, key, longest, oneOf, recordedAt, version } from "../columns";
import { staffRoles } from "../vocabulary";
import { customers } from "./customers";

export const people = pgTable(
  "people",
  {
    id: key("person_id"),
    name: text("name").notNull(),
    email: text("email").notNull(),
    /** One canonical form, so that two spellings are one account. */
    emailCanonical: text("email_canonical").notNull(),
    passwordHash: text("password_hash"),
    active: boolean("active").notNull().default(true),
    version: version(),
    createdAt: recordedAt("created_at"),
  },
  (table) => [
    uniqueIndex("people_one_account_per_email").on(table.emailCanonical),
    longest("people_name_length", table.name, 120),
    longest("people_email_length", table.email, 254),
  ],
);

export const personRoles = pgTable(
  "person_roles",
  {
    personId: uuid("person_id")
      .notNull()
      .references(() => people.id),
    role: text("role", { enum: staffRoles }).notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.personId, table.role] }),
    oneOf("person_roles_known", table.role, staffRoles),
  ],
);

/** Which people act for which customers; one customer has several, one person may have several. */
export const customerPeople = pgTable(
  "customer_people",
  {
    customerId: uuid("customer_id")
      .notNull()
      .references(() => customers.id),
    personId: uuid("person_id")
      .notNull()
      .references(() => people.id),
  },
  (table) => [
    primaryKey({ columns: [table.customerId, table.personId] }),
    index("customer_people_by_person").on(table.personId),
  ],
);

export const sessions = pgTable(
  "sessions",
  {
    /** SHA-256 of the cookie's token; the token itself is never stored. */
    id: text("session_id").primaryKey(),
    userId: uuid("person_id")
      .notNull()
      .references(() => people.id),
    /** End of the idle time. The absolute limit counts from created_at. */
    expiresAt: instant("expires_at").notNull(),
    createdAt: recordedAt("created_at"),
    /** Last time the person proved who they are with a password. */
    authenticatedAt: recordedAt("authenticated_at"),
    browser: text("browser").notNull().default(""),
  },
  (table) => [index("sessions_by_person").on(table.userId), index("sessions_by_expiry").on(table.expiresAt)],
);

/** Single-use links by which a person sets a password. */
export const entryLinks = pgTable(
  "entry_links",
  {
    tokenHash: text("token_hash").primaryKey(),
    personId: uuid("person_id")
      .notNull()
      .references(() => people.id),
    expiresAt: instant("expires_at").notNull(),
    usedAt: instant("used_at"),
    createdAt: recordedAt("created_at"),
  },
  (table) => [
    uniqueIndex("entry_links_one_open_per_person").on(table.personId).where(sql`${table.usedAt} is null`),
  ],
);
