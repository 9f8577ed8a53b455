import "server-only";
import { eq } from "drizzle-orm";
import { toleranceClasses } from "../../db/schema/tolerance-classes";
import type { Context } from "../access/actor";
import { notFound, refused } from "../access/errors";
import { requireSameVersion } from "../require-same-version";
import { write } from "../write";
import { reviseToleranceClassInput } from "./inputs";
import { type ClassLimits, insertRevision, loadRevisions, type ToleranceClassRevision } from "./internal";

const labels = {
  staticSpreadPercent: "Static flow spread, %",
  deadTimeRangeMs: "Dead time range, ms",
  resistanceRangeOhm: "Resistance range, Ω",
  leakageLimitMm3PerMin: "Leakage limit, mm³/min",
  limits: "Spread limits",
};

/** A class is never edited: certificates name the revision that they were judged by. */
export function reviseToleranceClass(context: Context, raw: unknown) {
  return write(
    context,
    "reviseToleranceClass",
    reviseToleranceClassInput,
    raw,
    async ({ transaction, input, record }) => {
      const { idempotencyKey: _key, toleranceClassId, version, ...values } = input;
      const [stored] = await transaction
        .select()
        .from(toleranceClasses)
        .where(eq(toleranceClasses.id, toleranceClassId))
        .for("update");
      if (!stored) throw notFound("tolerance class");
      const [latest] = (await loadRevisions(transaction, [toleranceClassId])).get(toleranceClassId) ?? [];
      if (!latest) throw new Error(`Tolerance class ${toleranceClassId} has no revision`);
      const before = limitsOf(latest);
      requireSameVersion({
        stored: { ...asTyped(before), version: stored.version },
        version,
        values: asTyped(values),
        labels,
      });
      if (stored.retiredAt) throw refused(`${stored.name} is retired. Reinstate it before it is revised.`);
      const revision = latest.revision + 1;
      await insertRevision(transaction, context, { toleranceClassId, revision }, values);
      await transaction
        .update(toleranceClasses)
        .set({ version: version + 1 })
        .where(eq(toleranceClasses.id, toleranceClassId));
      await record({
        event: "tolerance class revised",
        noun: "tolerance class",
        objectId: toleranceClassId,
        before: { revision: latest.revision, ...before },
        after: { revision, ...values },
      });
      return { toleranceClassId, revision };
    },
  );
}

function limitsOf(revision: ToleranceClassRevision): ClassLimits {
  return {
    staticSpreadPercent: revision.staticSpreadPercent,
    deadTimeRangeMs: revision.deadTimeRangeMs,
    resistanceRangeOhm: revision.resistanceRangeOhm,
    leakageLimitMm3PerMin: revision.leakageLimitMm3PerMin,
    limits: revision.spreadLimits,
  };
}

/** The list of limits as one line, as a conflict shows it. */
function asTyped({ limits, ...values }: ClassLimits) {
  const sorted = limits.toSorted((a, b) => a.fromPulseWidthMs - b.fromPulseWidthMs);
  return {
    ...values,
    limits: sorted.map((limit) => `${limit.spreadPercent} % from ${limit.fromPulseWidthMs} ms`).join(", "),
  };
}
