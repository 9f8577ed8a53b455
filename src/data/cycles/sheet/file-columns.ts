import {
  type ColumnPart,
  type DraftFields,
  draftField,
  heldOpenColumn,
  mostColumns,
  problemOf,
  widthColumnId,
} from "../draft-fields";
import type { FileColumn, FileReading } from "./file-row";
import { columnIds } from "./read-sheet";

type Say = (column: FileColumn, message: string) => void;

/** Finds the sheet's column of a file's reading, and adds the ones that the sheet lacks to `next`. */
export function fileColumnsOn(fields: DraftFields, next: DraftFields) {
  const taken = new Set(columnIds(fields));
  const columnOfWidth = new Map<number, string>();
  for (const id of taken) {
    const width = fields[draftField.column(id, "pulseWidthMs")];
    if (width) columnOfWidth.set(numberOf(width), id);
  }
  const filled = new Set(
    Object.keys(fields).flatMap((field) => /^reading\.[^.]+\.(\w+)/.exec(field)?.[1] ?? []),
  );

  function freeId(): string | null {
    for (let number = 1; number <= mostColumns; number++)
      if (!taken.has(widthColumnId(number))) return widthColumnId(number);
    return null;
  }

  /** A count or a time belongs to all readings of its column: a file may set it as long as none stands there. */
  function setPart(columnId: string, part: ColumnPart, text: string, say: Say, name: FileColumn): boolean {
    const field = draftField.column(columnId, part);
    const stands = next[field] ?? "";
    const differs = stands !== "" && numberOf(stands) !== Number(text);
    const mayReplace = !filled.has(columnId) && stands === (fields[field] ?? "");
    const wrong =
      problemOf(field, text) ??
      (differs && !mayReplace ? `${text} here, but ${stands} for this column elsewhere.` : null);
    if (wrong) say(name, wrong);
    else if (stands === "" || differs) next[field] = text;
    return wrong === null;
  }

  return function columnOf(reading: FileReading, say: Say): string | null {
    if (reading.openSeconds !== "") {
      const set = setPart(heldOpenColumn, "openSeconds", reading.openSeconds, say, "open_seconds");
      return set ? heldOpenColumn : null;
    }
    const width = Number(reading.pulseWidthMs);
    const columnId = columnOfWidth.get(width) ?? freeId();
    if (!columnId) say("pulse_width_ms", `A sheet has at most ${mostColumns} pulse widths.`);
    if (!columnId || !setPart(columnId, "pulseWidthMs", reading.pulseWidthMs, say, "pulse_width_ms"))
      return null;
    taken.add(columnId);
    columnOfWidth.set(width, columnId);
    return setPart(columnId, "pulseCount", reading.pulseCount, say, "pulse_count") ? columnId : null;
  };
}

function numberOf(text: string): number {
  return Number(text.trim().replace(",", "."));
}
