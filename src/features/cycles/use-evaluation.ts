"use client";
import { useDeferredValue, useMemo } from "react";
import type { CycleDraft } from "../../data/cycles";
import type { DraftFields } from "../../data/cycles/draft-fields";
import { evaluateSheet } from "../../data/cycles/sheet/evaluate-sheet";
import type { NewFinding } from "../../data/cycles/sheet/findings-of-run";
import { readSheet } from "../../data/cycles/sheet/read-sheet";
import type { CycleBench, Sheet } from "../../data/cycles/sheet/types";
import type { CycleFigures } from "../../metrology/cycle/types";

/** Fewer draws while typing: the intervals' last digit waits for the record. */
const drawsWhileTyping = 400;

export type Evaluation = {
  sheet: Sheet;
  bench: CycleBench | null;
  figures: CycleFigures | null;
  findings: NewFinding[];
  /** Why there are no figures. */
  problem: string | null;
};

/** What follows from the sheet as far as it is typed, by the functions that evaluate it once it is recorded. */
export function useEvaluation(draft: CycleDraft, fields: DraftFields): Evaluation {
  const calm = useDeferredValue(fields);
  return useMemo(() => evaluate(draft, calm), [draft, calm]);
}

function evaluate(draft: CycleDraft, fields: DraftFields): Evaluation {
  const sheet = readSheet(fields, draft.injectors);
  const bench = draft.benches.find((candidate) => candidate.benchId === sheet.benchId) ?? null;
  const nothing = { sheet, bench, figures: null, findings: [] };
  if (!bench) return { ...nothing, problem: "Figures appear as soon as a bench is chosen." };
  const { fluids, reference, model, earlier } = draft;
  try {
    const beside = { bench, fluids, reference, model, earlier, draws: drawsWhileTyping };
    return { sheet, bench, ...evaluateSheet(sheet, beside), problem: null };
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
    return { ...nothing, problem: `No figures with these conditions: ${error.message}.` };
  }
}
