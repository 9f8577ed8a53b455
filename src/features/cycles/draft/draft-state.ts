import type { DraftFields } from "../../../data/cycles/draft-fields";
import type { DraftChange, DraftConflict } from "../../../data/cycles/sheet/merge-changes";

export type Edit = { field: string; value: string };
export type Batch = { idempotencyKey: string; version: number; changes: DraftChange[] };

/** What the page knows of a draft: the server's texts, what is on its way there, and what was typed since. */
export type DraftState = {
  version: number;
  stored: DraftFields;
  inFlight: Batch | null;
  typed: Record<string, { base: string; value: string }>;
  conflicts: Record<string, DraftConflict>;
};

export type ServerAnswer = { version: number; fields: DraftFields | null };

export function openState(version: number, stored: DraftFields): DraftState {
  return { version, stored, inFlight: null, typed: {}, conflicts: {} };
}

/** The text that a field shows: the newest that was typed here, else the server's. */
export function textOf(state: DraftState, field: string): string {
  return state.conflicts[field]?.yours ?? state.typed[field]?.value ?? textOnItsWay(state, field);
}

function textOnItsWay(state: DraftState, field: string): string {
  const sent = state.inFlight?.changes.find((change) => change.field === field);
  return sent?.value ?? state.stored[field] ?? "";
}

export function shownFields(state: DraftState): DraftFields {
  const shown = { ...state.stored };
  for (const { field, value } of state.inFlight?.changes ?? []) shown[field] = value;
  for (const [field, { value }] of Object.entries(state.typed)) shown[field] = value;
  for (const { field, yours } of Object.values(state.conflicts)) shown[field] = yours;
  return shown;
}

export function typeInto(state: DraftState, edits: Edit[]): DraftState {
  const typed = { ...state.typed };
  const conflicts = { ...state.conflicts };
  for (const { field, value } of edits) {
    if (conflicts[field]) {
      conflicts[field] = { ...conflicts[field], yours: value };
      continue;
    }
    const base = typed[field]?.base ?? textOnItsWay(state, field);
    if (value === base) delete typed[field];
    else typed[field] = { base, value };
  }
  return { ...state, typed, conflicts };
}

/** Everything typed goes on its way; conflicts stay until somebody has chosen. */
export function sendTyped(state: DraftState, idempotencyKey: string): DraftState {
  const changes = Object.entries(state.typed).map(([field, change]) => ({ field, ...change }));
  if (state.inFlight || changes.length === 0) return state;
  return { ...state, typed: {}, inFlight: { idempotencyKey, version: state.version, changes } };
}

export function saved(state: DraftState, answer: ServerAnswer): DraftState {
  const stored = answer.fields ?? shownFields({ ...state, typed: {}, conflicts: {} });
  return noticeConflicts({ ...state, version: answer.version, stored, inFlight: null });
}

/** The server refused the batch: the fields that somebody else changed are in conflict, the rest is typed again. */
export function sentBack(state: DraftState, conflicts: DraftConflict[]): DraftState {
  const theirs = new Map(conflicts.map((conflict) => [conflict.field, conflict.theirs]));
  const typed = { ...state.typed };
  for (const { field, base, value } of state.inFlight?.changes ?? [])
    typed[field] = { base, value: typed[field]?.value ?? value };
  const stored = { ...state.stored, ...Object.fromEntries(theirs) };
  return noticeConflicts({ ...state, stored, typed, inFlight: null });
}

export function othersChanged(state: DraftState, answer: ServerAnswer): DraftState {
  // An answer that is older than what this page has saved meanwhile tells nothing.
  if (!answer.fields || answer.version <= state.version || state.inFlight) return state;
  return noticeConflicts({ ...state, version: answer.version, stored: answer.fields });
}

/** A field typed over a text that is no longer there is in conflict; one that now stands as typed is done. */
function noticeConflicts(state: DraftState): DraftState {
  const typed = { ...state.typed };
  const conflicts = { ...state.conflicts };
  for (const [field, { base, value }] of Object.entries(typed)) {
    const theirs = state.stored[field] ?? "";
    if (theirs === base) continue;
    delete typed[field];
    if (theirs !== value) conflicts[field] = { field, theirs, yours: value };
  }
  for (const [field, conflict] of Object.entries(conflicts)) {
    const theirs = state.stored[field] ?? "";
    if (theirs === conflict.yours) delete conflicts[field];
    else conflicts[field] = { ...conflict, theirs };
  }
  return { ...state, typed, conflicts };
}

export function chooseText(state: DraftState, field: string, whose: "theirs" | "yours"): DraftState {
  const conflict = state.conflicts[field];
  if (!conflict) return state;
  const { [field]: _settled, ...conflicts } = state.conflicts;
  if (whose === "theirs") return { ...state, conflicts };
  const typed = { ...state.typed, [field]: { base: conflict.theirs, value: conflict.yours } };
  return { ...state, conflicts, typed };
}
