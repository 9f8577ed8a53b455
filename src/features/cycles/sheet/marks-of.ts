import { type DraftFields, draftField, problemOf } from "../../../data/cycles/draft-fields";
import { isAcknowledged } from "../../../data/cycles/sheet/acknowledge";
import type { NewFinding } from "../../../data/cycles/sheet/findings-of-run";
import type { DraftConflict } from "../../../data/cycles/sheet/merge-changes";
import type { Sheet } from "../../../data/cycles/sheet/types";
import type { Mark } from "../grid/grid-context";

/** Which cells are marked and why: unreadable before somebody else's before doubtful. */
export function marksOf(
  sheet: Sheet,
  fields: DraftFields,
  findings: NewFinding[],
  conflicts: Record<string, DraftConflict>,
): Map<string, Mark> {
  const marks = new Map<string, Mark>();
  for (const finding of findings) {
    const kind = isAcknowledged(finding, sheet, fields) ? "acknowledged" : "doubtful";
    for (const field of fieldsOf(finding, sheet))
      if (marks.get(field)?.kind !== "doubtful") marks.set(field, { kind, reason: finding.sentence });
  }
  for (const { field, theirs, yours } of Object.values(conflicts))
    marks.set(field, {
      kind: "conflict",
      reason: `Somebody else typed ${theirs || "nothing"}, you typed ${yours || "nothing"}.`,
    });
  for (const [field, text] of Object.entries(fields)) {
    const problem = problemOf(field, text);
    if (problem) marks.set(field, { kind: "wrong", reason: problem });
  }
  return marks;
}

/** The cells that a finding is about; one about no width marks the injector's channel. */
function fieldsOf(finding: NewFinding, sheet: Sheet): string[] {
  const { setInjectorId, otherSetInjectorId, pulseWidthMs, kind } = finding;
  const named = [setInjectorId, otherSetInjectorId].filter((id) => typeof id === "string");
  const rows = named.length > 0 ? named : sheet.rows.map((row) => row.setInjectorId);
  const heldOpen = pulseWidthMs === null && (finding.key.endsWith("/open") || kind === "closure over 5 %");
  const column = sheet.columns.find((candidate) =>
    heldOpen ? candidate.heldOpen : pulseWidthMs !== null && candidate.pulseWidthMs === pulseWidthMs,
  );
  if (!column) return rows.map((row) => draftField.channel(row));
  return rows.flatMap((row) =>
    Array.from({ length: sheet.repeats }, (_, index) => draftField.reading(row, column.id, index + 1)),
  );
}
