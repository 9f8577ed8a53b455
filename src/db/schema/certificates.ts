import "server-only";
import { sql } from "drizzle-orm";
import {
  type AnyPgColumn,
  check,
  index,
  jsonb,
  pgTable,
  smallint,
  text,
  uniqueIndex,
  uuid,
} from "drizzle-orm/pg-core";
import { instant, key, oneOf, recordedAt } from "../columns";
import { certificateStates } from "../vocabulary";
import { blobs } from "./blobs";
import { cycleRevisions } from "./cycles";
import { people } from "./people";
import { sets } from "./sets";
import { toleranceClassRevisions } from "./tolerance-classes";

/** The manager's look at a set's results: sent back with a reason, or approved. */
export const setReviews = pgTable(
  "set_reviews",
  {
    id: key("set_review_id"),
    setId: uuid("set_id")
      .notNull()
      .references(() => sets.id),
    decision: text("decision", { enum: ["sent back", "approved"] }).notNull(),
    reason: text("reason"),
    asFoundRevisionId: uuid("as_found_revision_id")
      .notNull()
      .references(() => cycleRevisions.id),
    asLeftRevisionId: uuid("as_left_revision_id")
      .notNull()
      .references(() => cycleRevisions.id),
    reviewedBy: uuid("reviewed_by")
      .notNull()
      .references(() => people.id),
    reviewedAt: recordedAt("reviewed_at"),
  },
  (table) => [
    index("set_reviews_by_set").on(table.setId, table.reviewedAt),
    oneOf("set_reviews_decision_known", table.decision, ["sent back", "approved"]),
    check("set_reviews_reason", sql`${table.decision} = 'approved' or char_length(${table.reason}) > 0`),
  ],
);

/** Frozen at issue, except for its state: current, superseded or revoked. */
export const certificates = pgTable(
  "certificates",
  {
    id: key("certificate_id"),
    /** C26-0087/1: a reissue keeps the series number and counts the revision up. */
    number: text("number").notNull(),
    series: text("series").notNull(),
    revision: smallint("revision").notNull(),
    setId: uuid("set_id")
      .notNull()
      .references(() => sets.id),
    replacesId: uuid("replaces_id").references((): AnyPgColumn => certificates.id),
    replacementReason: text("replacement_reason"),
    asFoundRevisionId: uuid("as_found_revision_id")
      .notNull()
      .references(() => cycleRevisions.id),
    asLeftRevisionId: uuid("as_left_revision_id")
      .notNull()
      .references(() => cycleRevisions.id),
    toleranceClassRevisionId: uuid("tolerance_class_revision_id")
      .notNull()
      .references(() => toleranceClassRevisions.id),
    /** The whole of what the certificate says, as it was set on paper. */
    content: jsonb("content").notNull(),
    contentSha256: text("content_sha256").notNull(),
    pdfSha256: text("pdf_sha256")
      .notNull()
      .references(() => blobs.sha256),
    verificationCode: text("verification_code").notNull(),
    programVersion: text("program_version").notNull(),
    releasedBy: uuid("released_by")
      .notNull()
      .references(() => people.id),
    issuedAt: recordedAt("issued_at"),
    state: text("state", { enum: certificateStates }).notNull().default("current"),
    stateAt: instant("state_at"),
    stateBy: uuid("state_by").references(() => people.id),
    stateReason: text("state_reason"),
  },
  (table) => [
    uniqueIndex("certificates_one_per_number").on(table.number),
    uniqueIndex("certificates_revisions_in_order").on(table.series, table.revision),
    uniqueIndex("certificates_one_current_per_set").on(table.setId).where(sql`${table.state} = 'current'`),
    uniqueIndex("certificates_one_replacement").on(table.replacesId),
    uniqueIndex("certificates_one_per_code").on(table.verificationCode),
    index("certificates_by_set").on(table.setId, table.issuedAt),
    index("certificates_by_issue").on(table.issuedAt, table.id),
    oneOf("certificates_state_known", table.state, certificateStates),
    check(
      "certificates_replacement_reason",
      sql`(${table.replacesId} is null) = (${table.replacementReason} is null)`,
    ),
  ],
);
