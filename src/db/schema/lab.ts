import "server-only";
import { sql } from "drizzle-orm";
import { boolean, check, integer, jsonb, pgTable, text } from "drizzle-orm/pg-core";
import { between, longest, measured, oneOf, version } from "../columns";
import { paperSizes } from "../vocabulary";

export type TestPlan = {
  widths: { pulseWidthMs: number; pulseCount: number }[];
  heldOpenSeconds: number | null;
};

/** The one row of what the lab says of itself. */
export const labDetails = pgTable(
  "lab_details",
  {
    id: integer("lab_details_id").primaryKey().default(1),
    name: text("name").notNull(),
    address: text("address").notNull().default(""),
    phone: text("phone").notNull().default(""),
    email: text("email").notNull().default(""),
    /** Empty for most labs: nothing of it is ever printed then. */
    accreditation: text("accreditation").notNull().default(""),
    certificateWording: text("certificate_wording").notNull().default(""),
    timeZone: text("time_zone").notNull().default("UTC"),
    paperSize: text("paper_size", { enum: paperSizes }).notNull().default("A4"),
    /** Off: one person may test and release, and the certificate says so. */
    releaserIsAnother: boolean("releaser_is_another").notNull().default(true),
    /** Volume flows are stated for a fluid of this density. */
    referenceDensityGPerMl: measured("reference_density_g_per_ml", 7, 6).notNull(),
    referenceFluid: text("reference_fluid").notNull(),
    testPlan: jsonb("test_plan").$type<TestPlan>().notNull(),
    version: version(),
  },
  (table) => [
    check("lab_details_one_row", sql`${table.id} = 1`),
    longest("lab_details_name_length", table.name, 160),
    longest("lab_details_wording_length", table.certificateWording, 4000),
    between("lab_details_reference_density", table.referenceDensityGPerMl, 0.4, 1.2),
    oneOf("lab_details_paper_known", table.paperSize, paperSizes),
  ],
);
