import type { DraftFields } from "../../../data/cycles/draft-fields";
import type { DraftStore } from "./draft-store";

export type DraftChanges = {
  version: number;
  fields: DraftFields | null;
  savedBy: string;
  closed: "recorded" | "put away" | null;
};

/** What happened to the draft on the server since the version that the page knows. */
export async function fetchChanges(store: DraftStore): Promise<DraftChanges> {
  const { version } = store.snapshot().state;
  const response = await fetch(`/api/data/drafts/${store.draftId}?version=${version}`);
  if (!response.ok) throw new Error(`answer ${response.status}`);
  return (await response.json()) as DraftChanges;
}

export function takeChanges(store: DraftStore, changes: DraftChanges): void {
  if (changes.closed) store.close(`This sheet was ${changes.closed} by ${changes.savedBy}.`);
  else store.takeOthers(changes);
}
