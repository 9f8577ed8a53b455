import "server-only";
import { eq } from "drizzle-orm";
import { instruments } from "../../db/schema/instruments";
import type { Context } from "../access/actor";
import { notFound } from "../access/errors";
import { changedFields } from "../audit/changed-fields";
import { requireSameVersion } from "../require-same-version";
import { write } from "../write";
import { editInstrumentInput } from "./inputs";
import { refuseSecondOfCode } from "./internal";

const labels = { code: "Code", maker: "Maker", serial: "Serial", intervalMonths: "Interval, months" };

/** How it is called. Its range and division stay: recorded figures rest on them, so another scale is another instrument. */
export function editInstrument(context: Context, raw: unknown) {
  return write(
    context,
    "editInstrument",
    editInstrumentInput,
    raw,
    async ({ transaction, input, record }) => {
      const { idempotencyKey: _key, instrumentId, version, ...values } = input;
      const [stored] = await transaction
        .select()
        .from(instruments)
        .where(eq(instruments.id, instrumentId))
        .for("update");
      if (!stored) throw notFound("instrument");
      requireSameVersion({ stored, version, values, labels });
      await transaction
        .update(instruments)
        .set({ ...values, version: version + 1 })
        .where(eq(instruments.id, instrumentId))
        .catch(refuseSecondOfCode(values.code));
      await record({
        event: "instrument changed",
        noun: "instrument",
        objectId: instrumentId,
        ...changedFields(stored, values),
      });
      return { instrumentId };
    },
  );
}
