import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { cycleDrafts, cycles } from "../../db/schema/cycles";
import { people } from "../../db/schema/people";
import { setHolds } from "../../db/schema/sets";
import type { Context } from "../access/actor";
import { notFound } from "../access/errors";
import { read } from "../read";
import { earlierFiguresOf } from "./earlier-figures";
import { injectorsOfDraft } from "./injectors-of-draft";
import { getCycleDraftInput } from "./inputs";
import { loadBenches } from "./load-benches";
import { loadFluids } from "./load-fluids";
import { loadReadingFiles } from "./load-reading-files";
import { loadSetBasis } from "./load-set-basis";

/** A sheet with everything that the page needs to draw its lines while it is typed. */
export function getCycleDraft(context: Context, raw: unknown) {
  return read(context, "getCycleDraft", getCycleDraftInput, raw, async ({ connection, input }) => {
    const { draft, ...named } = await requireDraft(connection, input.draftId);
    const basis = (await loadSetBasis(connection, [draft.setId])).get(draft.setId)!;
    const measuredAt = draft.correctsCycleId ? named.measuredAt : null;
    const [injectors, benches, allFluids, earlier, files, hold] = await Promise.all([
      injectorsOfDraft(connection, draft),
      loadBenches(connection, measuredAt ? { at: measuredAt } : {}),
      loadFluids(connection),
      earlierFiguresOf(connection, draft, basis),
      loadReadingFiles(connection, draft.setId),
      selectHold(connection, draft.setId),
    ]);
    return {
      draftId: draft.id,
      setId: draft.setId,
      phase: draft.phase,
      corrects: draft.correctsCycleId
        ? { cycleId: draft.correctsCycleId, measuredAt: measuredAt!, openedBy: draft.openedBy }
        : null,
      version: draft.version,
      fields: draft.fields,
      savedAt: draft.savedAt.toISOString(),
      savedBy: named.savedBy,
      closed: draft.closedAt && { how: draft.recordedRevisionId ? "recorded" : "put away" },
      set: { number: basis.number, stage: basis.stage, customerName: basis.customerName, holdReason: hold },
      model: basis.model,
      reference: basis.reference,
      toleranceClass: basis.toleranceClass,
      workAsked: basis.workAsked,
      zone: basis.zone,
      injectors,
      benches,
      fluids: allFluids,
      earlier,
      files: files.filter((file) => file.draftId === draft.id),
    };
  });
}

async function requireDraft(connection: Connection, draftId: string) {
  const [row] = await connection
    .select({ draft: cycleDrafts, savedBy: people.name, measuredAt: cycles.recordedAt })
    .from(cycleDrafts)
    .innerJoin(people, eq(people.id, cycleDrafts.savedBy))
    .leftJoin(cycles, eq(cycles.id, cycleDrafts.correctsCycleId))
    .where(eq(cycleDrafts.id, draftId));
  if (!row) throw notFound("draft");
  return row;
}

async function selectHold(connection: Connection, setId: string): Promise<string | null> {
  const [hold] = await connection
    .select({ reason: setHolds.reason })
    .from(setHolds)
    .where(and(eq(setHolds.setId, setId), isNull(setHolds.clearedAt)));
  return hold?.reason ?? null;
}

export type CycleDraft = Awaited<ReturnType<typeof getCycleDraft>>;
