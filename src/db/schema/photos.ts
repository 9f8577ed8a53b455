import "server-only";
import { index, integer, pgTable, text, uuid } from "drizzle-orm/pg-core";
import { instant, key, longest, oneOf, recordedAt } from "../columns";
import { phases, photoKinds } from "../vocabulary";
import { blobs } from "./blobs";
import { setInjectors } from "./injectors";
import { people } from "./people";
import { sets } from "./sets";

export const photos = pgTable(
  "photos",
  {
    id: key("photo_id"),
    setId: uuid("set_id")
      .notNull()
      .references(() => sets.id),
    setInjectorId: uuid("set_injector_id").references(() => setInjectors.id),
    kind: text("kind", { enum: photoKinds }).notNull(),
    phase: text("phase", { enum: phases }),
    sha256: text("sha256")
      .notNull()
      .references(() => blobs.sha256),
    thumbnailSha256: text("thumbnail_sha256")
      .notNull()
      .references(() => blobs.sha256),
    widthPx: integer("width_px").notNull(),
    heightPx: integer("height_px").notNull(),
    /** What came in, before it was turned upright, stripped and re-encoded. */
    receivedSha256: text("received_sha256").notNull(),
    receivedBytes: integer("received_bytes").notNull(),
    receivedName: text("received_name").notNull(),
    claimedTakenAt: text("claimed_taken_at"),
    takenBy: uuid("taken_by")
      .notNull()
      .references(() => people.id),
    takenAt: recordedAt("taken_at"),
    hiddenBy: uuid("hidden_by").references(() => people.id),
    hiddenAt: instant("hidden_at"),
    hiddenReason: text("hidden_reason"),
  },
  (table) => [
    index("photos_by_set").on(table.setId, table.takenAt),
    index("photos_by_person").on(table.takenBy, table.takenAt),
    oneOf("photos_kind_known", table.kind, photoKinds),
    longest("photos_name_length", table.receivedName, 200),
  ],
);
