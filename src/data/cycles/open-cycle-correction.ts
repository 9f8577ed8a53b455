import "server-only";
import { eq } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { cycles } from "../../db/schema/cycles";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { forbidden, notFound } from "../access/errors";
import { requireOpenSet } from "../course";
import { write } from "../write";
import { findOpenDraft } from "./find-open-draft";
import { openCycleCorrectionInput } from "./inputs";
import { type LoadedRevision, loadRevisions } from "./load-revisions";
import { insertDraft } from "./open-cycle-draft";
import { fieldsOfRevision } from "./sheet/defaults";

/** Opens a sheet that holds the latest revision of a cycle, for the technician who recorded it to correct. */
export function openCycleCorrection(context: Context, raw: unknown) {
  return write(
    context,
    "openCycleCorrection",
    openCycleCorrectionInput,
    raw,
    async ({ transaction, input, record }) => {
      const { latest, setId, phase } = await requireOwnCycle(transaction, context, input.cycleId);
      const { personId } = requirePerson(context);
      const draftId =
        (await findOpenDraft(transaction, setId, phase, input.cycleId)) ??
        (await insertDraft(transaction, {
          setId,
          phase,
          correctsCycleId: input.cycleId,
          fields: fieldsOfRevision(latest),
          personId,
        }));
      await record({
        event: "draft opened",
        noun: "draft",
        objectId: draftId,
        setId,
        after: { correctsCycleId: input.cycleId },
      });
      return { draftId };
    },
  );
}

/** The cycle with its set locked, when it is one's own and the set is not released yet. */
export async function requireOwnCycle(transaction: Transaction, context: Context, cycleId: string) {
  const [cycle] = await transaction
    .select({ setId: cycles.setId, phase: cycles.phase })
    .from(cycles)
    .where(eq(cycles.id, cycleId));
  if (!cycle) throw notFound("cycle");
  await requireOpenSet(transaction, cycle.setId);
  const revisions = await loadRevisions(transaction, [cycle.setId]);
  const own = revisions.filter((revision) => revision.cycle.cycleId === cycleId);
  const latest = own.at(-1) as LoadedRevision;
  if (own[0]?.recordedBy.personId !== requirePerson(context).personId) throw forbidden();
  return { ...cycle, latest };
}
