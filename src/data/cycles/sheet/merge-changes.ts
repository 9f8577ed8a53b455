import type { DraftFields } from "../draft-fields";

/** One text as it was typed over another. */
export type DraftChange = { field: string; base: string; value: string };
export type DraftConflict = { field: string; theirs: string; yours: string };

/**
 * Sets each field whose stored text is still the one it was typed over, or already the one typed. Any other stored text is
 * somebody else's: a conflict. An empty text takes the field away.
 */
export function mergeChanges(
  stored: DraftFields,
  changes: DraftChange[],
): { fields: DraftFields; changed: DraftChange[]; conflicts: DraftConflict[] } {
  const fields = { ...stored };
  const changed: DraftChange[] = [];
  const conflicts: DraftConflict[] = [];
  for (const { field, base, value } of changes) {
    const theirs = stored[field] ?? "";
    if (theirs === value) continue;
    if (theirs !== base) {
      conflicts.push({ field, theirs, yours: value });
      continue;
    }
    changed.push({ field, base, value });
    if (value === "") delete fields[field];
    else fields[field] = value;
  }
  return { fields, changed, conflicts };
}
