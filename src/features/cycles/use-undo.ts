"use client";
import { useRef } from "react";
import type { Edit } from "./draft/draft-state";
import type { DraftStore } from "./draft/draft-store";
import { type Step, stepOf, takeBack } from "./grid/edit-history";

const mostSteps = 100;

/** Types into the store and remembers how to take each paste, fill, clear and cell back. */
export function useUndo(store: DraftStore) {
  const steps = useRef<Step[]>([]);

  function edit(edits: Edit[]): void {
    const step = stepOf(store.snapshot().fields, edits);
    if (step.length === 0) return;
    steps.current = [...steps.current.slice(1 - mostSteps), step];
    store.type(edits);
  }

  function undo(): void {
    const step = steps.current.pop();
    if (step) store.type(takeBack(step, store.snapshot().fields));
  }

  return { edit, undo };
}
