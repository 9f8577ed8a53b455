import { type DraftFields, draftField } from "../draft-fields";
import type { Finding } from "../results";
import { fingerprint } from "./fingerprint";
import type { Sheet } from "./types";

type Doubt = Pick<Finding, "key" | "setInjectorId" | "pulseWidthMs">;

/**
 * What stands in the acknowledgement of a finding: a fingerprint of the texts in doubt, so that it lapses as soon as one of
 * them is typed anew.
 */
export function acknowledgementOf(finding: Doubt, sheet: Sheet, fields: DraftFields): string {
  const rows = finding.setInjectorId ? [finding.setInjectorId] : sheet.rows.map((row) => row.setInjectorId);
  const columns = sheet.columns.filter(
    (column) => finding.pulseWidthMs === null || column.pulseWidthMs === finding.pulseWidthMs,
  );
  const texts: string[] = [];
  for (const row of rows)
    for (const column of columns)
      for (let repeat = 1; repeat <= sheet.repeats; repeat++)
        texts.push(fields[draftField.reading(row, column.id, repeat)] ?? "");
  return fingerprint(texts.join("|"));
}

export function isAcknowledged(finding: Doubt, sheet: Sheet, fields: DraftFields): boolean {
  return fields[draftField.acknowledged(finding.key)] === acknowledgementOf(finding, sheet, fields);
}
