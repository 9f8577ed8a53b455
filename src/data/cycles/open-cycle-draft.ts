import "server-only";
import { eq } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { cycleDrafts } from "../../db/schema/cycles";
import { labDetails } from "../../db/schema/lab";
import type { Phase } from "../../db/vocabulary";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { requireOpenSet } from "../course";
import { write } from "../write";
import type { DraftFields } from "./draft-fields";
import { findOpenDraft } from "./find-open-draft";
import { openCycleDraftInput } from "./inputs";
import { injectorsInSet } from "./internal";
import { loadBenches } from "./load-benches";
import { loadRevisions } from "./load-revisions";
import { requireTurn } from "./require-turn";
import { columnsOfPlan, conditionsOfBench, placesOnBench, planOfRevision } from "./sheet/defaults";
import { isReady } from "./sheet/missing-calibrations";

/** Opens the sheet of a set's next cycle, or the one that is open already, filled with what is known beforehand. */
export function openCycleDraft(context: Context, raw: unknown) {
  return write(
    context,
    "openCycleDraft",
    openCycleDraftInput,
    raw,
    async ({ transaction, input, record }) => {
      const { setId, phase } = input;
      const set = await requireOpenSet(transaction, setId);
      requireTurn(set.stage, phase);
      const { personId } = requirePerson(context);
      const draftId =
        (await findOpenDraft(transaction, setId, phase, null)) ??
        (await insertDraft(transaction, {
          setId,
          phase,
          fields: await startingFields(transaction, setId, phase),
          personId,
        }));
      await record({ event: "draft opened", noun: "draft", objectId: draftId, setId, after: { phase } });
      return { draftId };
    },
  );
}

type NewDraft = {
  setId: string;
  phase: Phase;
  fields: DraftFields;
  personId: string;
  correctsCycleId?: string;
};

export async function insertDraft(
  transaction: Transaction,
  { personId, ...draft }: NewDraft,
): Promise<string> {
  const [opened] = await transaction
    .insert(cycleDrafts)
    .values({ ...draft, openedBy: personId, savedBy: personId })
    .returning({ id: cycleDrafts.id });
  return opened!.id;
}

/** As the set's last cycle was measured; the first one by the lab's test plan, on the one bench that is ready if there is one. */
async function startingFields(transaction: Transaction, setId: string, phase: Phase): Promise<DraftFields> {
  const injectors = await injectorsInSet(transaction, setId);
  const measured = await loadRevisions(transaction, [setId], "that count");
  const last = measured.find((revision) => revision.cycle.phase === phase) ?? measured.at(-1);
  const benches = await loadBenches(transaction);
  if (last) {
    const bench = benches.find((candidate) => candidate.benchId === last.bench.benchId);
    return { ...(bench ? placesOnBench(injectors, bench) : {}), ...planOfRevision(last, injectors) };
  }
  const [lab] = await transaction
    .select({ testPlan: labDetails.testPlan })
    .from(labDetails)
    .where(eq(labDetails.id, 1));
  const ready = benches.filter(isReady);
  const [bench] = ready.length === 1 ? ready : [];
  return {
    ...(lab ? columnsOfPlan(lab.testPlan) : {}),
    ...(bench ? { ...conditionsOfBench(bench), ...placesOnBench(injectors, bench) } : {}),
  };
}
