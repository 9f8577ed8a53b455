import type { DraftFields } from "../../../data/cycles/draft-fields";
import type { DraftConflict } from "../../../data/cycles/sheet/merge-changes";
import type { Batch } from "./draft-state";

/** What became of a batch on its way to the server. */
export type SendResult =
  | { kind: "saved"; version: number; savedAt: string; fields: DraftFields | null }
  | { kind: "conflict"; conflicts: DraftConflict[] }
  | { kind: "sign in" }
  | { kind: "closed"; message: string }
  | { kind: "refused"; message: string }
  | { kind: "unreachable" };

type Problem = { type?: string; title?: string; values?: DraftConflict[] };

const patienceMs = 10_000;

/** Sends a batch of changes. A dead network, a dead server and a busy one are the same: try again later. */
export async function sendBatch(draftId: string, batch: Batch, leaving = false): Promise<SendResult> {
  try {
    const response = await fetch(`/api/data/drafts/${draftId}`, {
      method: "PATCH",
      headers: { "Content-Type": "application/json" },
      body: JSON.stringify(batch),
      keepalive: leaving,
      signal: AbortSignal.timeout(patienceMs),
    });
    if (response.ok) return { kind: "saved", ...((await response.json()) as SavedAnswer) };
    return refusalOf(response.status, (await response.json()) as Problem);
  } catch {
    return { kind: "unreachable" };
  }
}

type SavedAnswer = { version: number; savedAt: string; fields: DraftFields | null };

function refusalOf(status: number, problem: Problem): SendResult {
  const message = problem.title ?? "The server refused it.";
  if (status === 401) return { kind: "sign in" };
  if (problem.type === "urn:evenrail:conflict") return { kind: "conflict", conflicts: problem.values ?? [] };
  if (problem.type === "urn:evenrail:refused") return { kind: "closed", message };
  return status >= 500 || status === 429 ? { kind: "unreachable" } : { kind: "refused", message };
}
