import "server-only";
import { eq, sql } from "drizzle-orm";
import { toleranceClasses } from "../../db/schema/tolerance-classes";
import type { Context } from "../access/actor";
import { notFound } from "../access/errors";
import { read } from "../read";
import { getToleranceClassInput } from "./inputs";
import { loadRevisions } from "./internal";

/** The class with all its revisions, the newest first. */
export function getToleranceClass(context: Context, raw: unknown) {
  return read(
    context,
    "getToleranceClass",
    getToleranceClassInput,
    raw,
    async ({ connection, input: { toleranceClassId } }) => {
      const [found] = await connection
        .select({
          toleranceClassId: toleranceClasses.id,
          name: toleranceClasses.name,
          version: toleranceClasses.version,
          retired: sql<boolean>`${toleranceClasses.retiredAt} is not null`,
        })
        .from(toleranceClasses)
        .where(eq(toleranceClasses.id, toleranceClassId));
      if (!found) throw notFound("tolerance class");
      const revisions = (await loadRevisions(connection, [toleranceClassId])).get(toleranceClassId) ?? [];
      return { ...found, revisions };
    },
  );
}
