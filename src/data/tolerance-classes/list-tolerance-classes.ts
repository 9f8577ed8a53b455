import "server-only";
import { asc, isNull, sql } from "drizzle-orm";
import { toleranceClasses } from "../../db/schema/tolerance-classes";
import type { Context } from "../access/actor";
import { read } from "../read";
import { listToleranceClassesInput } from "./inputs";
import { loadRevisions } from "./internal";

/** Each class as its latest revision states it. Retired ones only when asked for. */
export function listToleranceClasses(context: Context, raw?: unknown) {
  return read(
    context,
    "listToleranceClasses",
    listToleranceClassesInput,
    raw,
    async ({ connection, input }) => {
      const classes = await connection
        .select({
          toleranceClassId: toleranceClasses.id,
          name: toleranceClasses.name,
          retired: sql<boolean>`${toleranceClasses.retiredAt} is not null`,
          // Written out, since drizzle leaves the tables' names out of a selection from one table.
          setCount: sql<number>`(select count(*)::int from sets s
            where s.tolerance_class_id = tolerance_classes.tolerance_class_id)`,
        })
        .from(toleranceClasses)
        .where(input.withRetired ? undefined : isNull(toleranceClasses.retiredAt))
        .orderBy(sql`${toleranceClasses.retiredAt} is not null`, asc(sql`lower(${toleranceClasses.name})`));
      const revisions = await loadRevisions(
        connection,
        classes.map((row) => row.toleranceClassId),
      );
      return classes.flatMap((row) => {
        const latest = revisions.get(row.toleranceClassId)?.[0];
        return latest ? [{ ...row, latest }] : [];
      });
    },
  );
}
