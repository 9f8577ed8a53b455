import "server-only";
import { sql } from "drizzle-orm";
import { index, pgTable, text } from "drizzle-orm/pg-core";
import { key, longest, recordedAt, version } from "../columns";

export const customers = pgTable(
  "customers",
  {
    id: key("customer_id"),
    name: text("name").notNull(),
    contactName: text("contact_name").notNull().default(""),
    email: text("email").notNull().default(""),
    phone: text("phone").notNull().default(""),
    address: text("address").notNull().default(""),
    /** Never shown to the customer. */
    internalNote: text("internal_note").notNull().default(""),
    version: version(),
    createdAt: recordedAt("created_at"),
  },
  (table) => [
    index("customers_by_name_parts").using("gin", sql`lower(${table.name}) gin_trgm_ops`),
    index("customers_by_name").on(sql`lower(${table.name})`, table.id),
    longest("customers_name_length", table.name, 160),
    longest("customers_address_length", table.address, 600),
    longest("customers_note_length", table.internalNote, 4000),
  ],
);
