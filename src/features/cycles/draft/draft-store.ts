import type { DraftFields } from "../../../data/cycles/draft-fields";
import { newKey } from "../../../ui/form/new-key";
import {
  chooseText,
  type DraftState,
  type Edit,
  openState,
  othersChanged,
  type ServerAnswer,
  saved,
  sendTyped,
  sentBack,
  shownFields,
  typeInto,
} from "./draft-state";
import { keepText, keptTexts, letGo } from "./kept-texts";
import { type SendResult, sendBatch } from "./send-batch";

export type SaveStatus = "saved" | "waiting" | "saving" | "unreachable" | "sign in" | "closed" | "refused";

export type DraftSnapshot = {
  state: DraftState;
  fields: DraftFields;
  status: SaveStatus;
  savedAt: string;
  /** Why the sheet takes nothing more, or what the server said. */
  message: string | null;
  /** How many texts were found on this device that the server had not got. */
  restored: number;
  /** False: the browser keeps nothing, so only the server's copy survives this tab. */
  keptHere: boolean;
};

const quietMs = 900;
const retryMs = [2000, 4000, 8000, 15_000];

/** Holds a draft's texts, keeps them on the device, and brings them to the server a moment after the last key. */
export class DraftStore {
  #snapshot: DraftSnapshot;
  #listeners = new Set<() => void>();
  #timer: ReturnType<typeof setTimeout> | undefined;
  #failures = 0;
  #sending: Promise<void> | null = null;

  constructor(
    readonly draftId: string,
    opened: { version: number; fields: DraftFields; savedAt: string },
  ) {
    const { version, fields, savedAt } = opened;
    const state = openState(version, fields);
    this.#snapshot = { state, fields, savedAt, status: "saved", message: null, restored: 0, keptHere: true };
  }

  subscribe = (listener: () => void) => {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  };

  snapshot = () => this.#snapshot;

  type(edits: Edit[]): void {
    const { state, status } = this.#snapshot;
    if (status === "closed") return;
    this.#set({ state: typeInto(state, edits), status: status === "saved" ? "waiting" : status });
    this.#keep(edits.map((edit) => edit.field));
    if (!this.#sending) this.#later(quietMs);
  }

  choose(field: string, whose: "theirs" | "yours"): void {
    this.#set({ state: chooseText(this.#snapshot.state, field, whose), status: "waiting" });
    this.#keep([field]);
    this.#later(0);
  }

  takeOthers(answer: ServerAnswer): void {
    this.#set({ state: othersChanged(this.#snapshot.state, answer) });
  }

  /** Brings what was typed to the server now; true when nothing is left behind. */
  async flush(leaving = false): Promise<boolean> {
    clearTimeout(this.#timer);
    const already = this.#sending;
    await already;
    this.#sending ??= this.#send(leaving).finally(() => {
      this.#sending = null;
    });
    await this.#sending;
    const { inFlight, typed, conflicts } = this.#snapshot.state;
    return !inFlight && isEmpty(typed) && isEmpty(conflicts);
  }

  /** Takes up what an earlier tab or a dead server left on this device. */
  restore(): void {
    const kept = keptTexts(this.draftId);
    const { state } = this.#snapshot;
    const behind = { ...state, typed: { ...kept, ...state.typed }, version: state.version - 1 };
    const taken = othersChanged(behind, { version: state.version, fields: state.stored });
    const left = Object.keys(kept).filter((field) => taken.typed[field] || taken.conflicts[field]);
    for (const field of Object.keys(kept)) if (!left.includes(field)) letGo(this.draftId, field);
    if (left.length === 0) return;
    this.#set({ state: taken, restored: left.length, status: "waiting" });
    this.#later(0);
  }

  close(message: string): void {
    clearTimeout(this.#timer);
    this.#set({ status: "closed", message });
  }

  async #send(leaving: boolean): Promise<void> {
    const { state, status } = this.#snapshot;
    if (status === "closed") return;
    const sending = state.inFlight ? state : sendTyped(state, newKey());
    if (!sending.inFlight) return;
    this.#set({ state: sending, status: this.#failures === 0 ? "saving" : status });
    const sent = sending.inFlight.changes;
    this.#take(await sendBatch(this.draftId, sending.inFlight, leaving));
    const { inFlight, typed, conflicts } = this.#snapshot.state;
    if (inFlight) return;
    for (const { field, value } of sent)
      if (!conflicts[field] && !typed[field]) letGo(this.draftId, field, value);
  }

  #take(result: SendResult): void {
    const { state } = this.#snapshot;
    this.#failures = result.kind === "unreachable" || result.kind === "sign in" ? this.#failures + 1 : 0;
    if (result.kind === "saved") {
      const now = saved(state, result);
      const status = isEmpty(now.typed) ? "saved" : "waiting";
      this.#set({ state: now, savedAt: result.savedAt, message: null, status });
    } else if (result.kind === "conflict") {
      this.#set({ state: sentBack(state, result.conflicts), status: "waiting" });
    } else {
      this.#set({ status: result.kind, message: "message" in result ? result.message : null });
    }
    const { typed, conflicts } = this.#snapshot.state;
    this.#keep([...Object.keys(typed), ...Object.keys(conflicts)]);
    if (this.#failures > 0) this.#later(retryMs[Math.min(this.#failures, retryMs.length) - 1]!);
    else if (!isEmpty(typed) && this.#snapshot.status === "waiting") this.#later(quietMs);
  }

  #keep(fields: string[]): void {
    const { typed, conflicts, inFlight } = this.#snapshot.state;
    let keptHere = true;
    for (const field of fields) {
      const conflict = conflicts[field];
      const entry = conflict ? { base: conflict.theirs, value: conflict.yours } : typed[field];
      if (entry) keptHere = keepText(this.draftId, field, entry) && keptHere;
      else if (!inFlight?.changes.some((change) => change.field === field)) letGo(this.draftId, field);
    }
    if (keptHere !== this.#snapshot.keptHere) this.#set({ keptHere });
  }

  #later(delayMs: number): void {
    clearTimeout(this.#timer);
    this.#timer = setTimeout(() => void this.flush(), delayMs);
  }

  #set(change: Partial<DraftSnapshot>): void {
    const { state, fields } = this.#snapshot;
    const next = change.state ?? state;
    this.#snapshot = { ...this.#snapshot, ...change, fields: next === state ? fields : shownFields(next) };
    for (const listener of this.#listeners) listener();
  }
}

function isEmpty(entries: Record<string, unknown>): boolean {
  return Object.keys(entries).length === 0;
}
