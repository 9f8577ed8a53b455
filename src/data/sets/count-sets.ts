import "server-only";
import { count, eq } from "drizzle-orm";
import { labDetails } from "../../db/schema/lab";
import { sets } from "../../db/schema/sets";
import type { Context } from "../access/actor";
import { noInput } from "../fields";
import { read } from "../read";
import { listSetsInput, setViews } from "./inputs";
import { matchingSets } from "./matching-sets";

/** How many sets each view of the list holds. */
export function countSets(context: Context, raw?: unknown) {
  return read(context, "countSets", noInput, raw, async ({ connection, grant }) => {
    const counted = await Promise.all(
      setViews.map(async (view) => {
        const [all] = await connection
          .select({ total: count() })
          .from(sets)
          .innerJoin(labDetails, eq(labDetails.id, 1))
          .where(matchingSets(listSetsInput.parse({ view }), grant));
        return [view, all!.total] as const;
      }),
    );
    return Object.fromEntries(counted) as Record<(typeof setViews)[number], number>;
  });
}
