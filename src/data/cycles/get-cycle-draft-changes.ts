import "server-only";
import { eq } from "drizzle-orm";
import { cycleDrafts, cycleRevisions } from "../../db/schema/cycles";
import { people } from "../../db/schema/people";
import type { Context } from "../access/actor";
import { notFound } from "../access/errors";
import { read } from "../read";
import { getCycleDraftChangesInput } from "./inputs";

/** What others did to a draft since the version that the page knows; `fields` is null when nothing changed. */
export function getCycleDraftChanges(context: Context, raw: unknown) {
  return read(
    context,
    "getCycleDraftChanges",
    getCycleDraftChangesInput,
    raw,
    async ({ connection, input }) => {
      const [row] = await connection
        .select({ draft: cycleDrafts, savedBy: people.name, cycleId: cycleRevisions.cycleId })
        .from(cycleDrafts)
        .innerJoin(people, eq(people.id, cycleDrafts.savedBy))
        .leftJoin(cycleRevisions, eq(cycleRevisions.id, cycleDrafts.recordedRevisionId))
        .where(eq(cycleDrafts.id, input.draftId));
      if (!row) throw notFound("draft");
      const { draft, savedBy } = row;
      return {
        version: draft.version,
        fields: draft.version === input.version ? null : draft.fields,
        savedBy,
        savedAt: draft.savedAt.toISOString(),
        closed: draft.closedAt && (row.cycleId ? ("recorded" as const) : ("put away" as const)),
        setId: draft.setId,
      };
    },
  );
}
