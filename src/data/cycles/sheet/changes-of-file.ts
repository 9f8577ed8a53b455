import { type DraftFields, draftField, problemOf } from "../draft-fields";
import { fileColumnsOn } from "./file-columns";
import type { FileColumn, FileReading } from "./file-row";
import type { DraftChange } from "./merge-changes";
import type { SheetInjector } from "./types";

type Problem = { line: number; column: string | null; message: string };
type Target = { fields: DraftFields; injectors: SheetInjector[]; collects: "volume" | "mass" };

/** What a file of readings changes on a sheet, or what keeps it from being put there; columns that are new are added. */
export function changesOfFile(
  readings: FileReading[],
  { fields, injectors, collects }: Target,
): { changes: DraftChange[]; problems: Problem[] } {
  const next: DraftFields = { ...fields };
  const problems: Problem[] = [];
  const lineOf = new Map<string, number>();
  const byTag = new Map(injectors.map((injector) => [injector.tag.toUpperCase(), injector.setInjectorId]));
  const columnOf = fileColumnsOn(fields, next);
  for (const reading of readings) {
    const { line } = reading;
    const say = (column: FileColumn, message: string) => problems.push({ line, column, message });
    const injector = byTag.get(reading.tag.toUpperCase());
    const amountColumn = reading.collects === "mass" ? "amount_g" : "amount_ml";
    if (!injector) say("tag", `${reading.tag} is not in this set.`);
    if (reading.collects !== collects) say(amountColumn, wrongUnit(collects));
    if (!/^([1-9]|1\d|20)$/.test(reading.repeat)) say("repeat", "A whole number from 1 to 20.");
    const columnId = columnOf(reading, say);
    if (!injector || !columnId) continue;
    const field = draftField.reading(injector, columnId, Number(reading.repeat));
    const wrong = problemOf(field, reading.amount);
    if (wrong) say(amountColumn, wrong);
    const earlier = lineOf.get(field);
    if (earlier) say("repeat", `Line ${earlier} gives the same reading; number the repeats 1, 2, …`);
    lineOf.set(field, line);
    next[field] = reading.amount;
  }
  return { changes: differences(fields, next), problems };
}

function wrongUnit(collects: "volume" | "mass"): string {
  return collects === "volume"
    ? "The bench collects volume: amount_ml is needed."
    : "The bench collects mass: amount_g is needed.";
}

function differences(before: DraftFields, after: DraftFields): DraftChange[] {
  return Object.entries(after)
    .filter(([field, value]) => (before[field] ?? "") !== value)
    .map(([field, value]) => ({ field, base: before[field] ?? "", value }));
}
