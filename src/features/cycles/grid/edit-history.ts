import type { DraftFields } from "../../../data/cycles/draft-fields";
import type { Edit } from "../draft/draft-state";

/** What a paste, a fill or a typed cell changed: enough to take it back. */
export type Step = { field: string; before: string; after: string }[];

export function stepOf(fields: DraftFields, edits: Edit[]): Step {
  return edits
    .map(({ field, value }) => ({ field, before: fields[field] ?? "", after: value }))
    .filter((change) => change.before !== change.after);
}

/** Takes a step back where its texts still stand; what was typed over them since stays. */
export function takeBack(step: Step, fields: DraftFields): Edit[] {
  return step
    .filter(({ field, after }) => (fields[field] ?? "") === after)
    .map(({ field, before }) => ({ field, value: before }));
}
