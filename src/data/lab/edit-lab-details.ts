import "server-only";
import { eq, sql } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { labDetails, type TestPlan } from "../../db/schema/lab";
import type { Context } from "../access/actor";
import { invalid } from "../access/errors";
import { changedFields } from "../audit/changed-fields";
import { requireSameVersion } from "../require-same-version";
import { write } from "../write";
import { editLabDetailsInput } from "./inputs";
import { labColumns } from "./internal";

const labels = {
  name: "Lab's name",
  address: "Address",
  phone: "Phone",
  email: "E-mail",
  accreditation: "Accreditation",
  certificateWording: "Certificate wording",
  timeZone: "Time zone",
  paperSize: "Paper",
  releaserIsAnother: "Released by another person",
  referenceFluid: "Reference fluid",
  referenceDensityGPerMl: "Reference density, g/mL",
  testPlan: "Test plan",
};

export function editLabDetails(context: Context, raw: unknown) {
  return write(
    context,
    "editLabDetails",
    editLabDetailsInput,
    raw,
    async ({ transaction, input, record }) => {
      const { idempotencyKey: _key, version, widths, heldOpenSeconds, ...plain } = input;
      const testPlan = { widths, heldOpenSeconds };
      const [row] = await transaction.select(labColumns).from(labDetails).for("update");
      const stored = { ...row!, testPlan: planInWords(row!.testPlan) };
      const values = { ...plain, testPlan: planInWords(testPlan) };
      requireSameVersion({ stored, version, values, labels });
      await requireKnownZone(transaction, plain.timeZone);
      await transaction
        .update(labDetails)
        .set({ ...plain, testPlan, version: version + 1 })
        .where(eq(labDetails.id, 1));
      await record({ event: "lab details changed", noun: "lab", ...changedFields(stored, values) });
      return { version: version + 1 };
    },
  );
}

/** The application and the database keep their own lists of zones; a stored one is known to both. */
async function requireKnownZone(transaction: Transaction, timeZone: string): Promise<void> {
  const known = await transaction.execute(sql`select from pg_timezone_names where name = ${timeZone}`);
  if (known.length === 0)
    throw invalid(
      "timeZone",
      `The database knows no time zone ${timeZone}. Choose one such as Europe/Berlin.`,
    );
}

function planInWords({ widths, heldOpenSeconds }: TestPlan): string {
  const runs = widths.map(({ pulseWidthMs, pulseCount }) => `${pulseWidthMs} ms × ${pulseCount}`);
  return [...runs, ...(heldOpenSeconds === null ? [] : [`held open ${heldOpenSeconds} s`])].join(", ");
}
