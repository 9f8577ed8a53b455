import "server-only";
import { customType, integer, pgTable, text } from "drizzle-orm/pg-core";
import { between, recordedAt } from "../columns";

const bytea = customType<{ data: Uint8Array; driverData: Uint8Array }>({ dataType: () => "bytea" });

/** Files live in the database, so that one dump is the whole record. */
export const blobs = pgTable(
  "blobs",
  {
    sha256: text("sha256").primaryKey(),
    mediaType: text("media_type").notNull(),
    sizeBytes: integer("size_bytes").notNull(),
    bytes: bytea("bytes").notNull(),
    createdAt: recordedAt("created_at"),
  },
  (table) => [between("blobs_size", table.sizeBytes, 0, 26_214_400)],
);
