import "server-only";
import type { Connection } from "../../db/client";
import type { CycleFigures } from "../../metrology/cycle/types";
import { evaluateRevision } from "./evaluate-revision";
import { loadRevisions } from "./load-revisions";
import type { SetBasis } from "./load-set-basis";
import type { OpenDraft } from "./lock-open-draft";

/** The figures as found, which a cycle as left is compared with; null for a cycle as found. */
export async function earlierFiguresOf(
  connection: Connection,
  draft: Pick<OpenDraft, "setId" | "phase">,
  basis: SetBasis,
): Promise<CycleFigures | null> {
  if (draft.phase === "as found") return null;
  const measured = await loadRevisions(connection, [draft.setId], "that count");
  const found = measured.find((revision) => revision.cycle.phase === "as found");
  if (!found) return null;
  return evaluateRevision(found, { basis, tagOf: (id) => id, earlier: null }).figures;
}
