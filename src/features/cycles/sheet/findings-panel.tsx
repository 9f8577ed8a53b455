"use client";
import { draftField } from "../../../data/cycles/draft-fields";
import { acknowledgementOf, isAcknowledged } from "../../../data/cycles/sheet/acknowledge";
import type { NewFinding } from "../../../data/cycles/sheet/findings-of-run";
import type { Sheet as CycleSheet } from "../../../data/cycles/sheet/types";
import { plural } from "../../../format/plural";
import { StatusMark } from "../../../ui/feedback/status-mark";
import { Sheet } from "../../../ui/layout/sheet";
import { useSheet } from "./sheet-context";

/** Readings in doubt: read again, or recorded as read. The tick lapses when the reading is typed anew. */
export function FindingsPanel({ findings, sheet }: { findings: NewFinding[]; sheet: CycleSheet }) {
  const { fields, readOnly, edit } = useSheet();
  const open = findings.filter((finding) => !isAcknowledged(finding, sheet, fields));
  return (
    <Sheet
      id="doubtful"
      title="Doubtful readings"
      note={findings.length === 0 ? "none" : `${open.length} of ${findings.length} to look at`}
    >
      {findings.length === 0 ? (
        <p className="text-small text-ink-2">Nothing typed so far is in doubt.</p>
      ) : (
        <ul className="divide-y divide-hair-2" aria-label={plural(findings.length, "doubtful reading")}>
          {findings.map((finding) => (
            <FindingLine
              key={finding.key}
              finding={finding}
              acknowledged={isAcknowledged(finding, sheet, fields)}
              readOnly={readOnly}
              onTick={(ticked) =>
                edit([
                  {
                    field: draftField.acknowledged(finding.key),
                    value: ticked ? acknowledgementOf(finding, sheet, fields) : "",
                  },
                ])
              }
            />
          ))}
        </ul>
      )}
    </Sheet>
  );
}

type LineProps = {
  finding: NewFinding;
  acknowledged: boolean;
  readOnly: boolean;
  onTick: (ticked: boolean) => void;
};

function FindingLine({ finding, acknowledged, readOnly, onTick }: LineProps) {
  return (
    <li className="flex flex-wrap items-start justify-between gap-x-4 gap-y-1 py-2">
      <p className="min-w-0 flex-1 basis-64 text-small">
        <StatusMark kind={acknowledged ? "neutral" : "due"}>{finding.kind}</StatusMark>{" "}
        <span className="text-ink">{finding.sentence}</span>
      </p>
      <label className="touch-target inline-flex items-center gap-2 text-small font-medium">
        <input
          type="checkbox"
          checked={acknowledged}
          disabled={readOnly}
          onChange={(event) => onTick(event.target.checked)}
          className="size-4"
        />
        Recorded as read
      </label>
    </li>
  );
}
