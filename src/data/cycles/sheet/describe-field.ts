import type { Sheet } from "./types";

const plain: Record<string, string> = {
  benchId: "Bench",
  fluidId: "Fluid",
  note: "Note",
  repeats: "Runs",
  readings: "Readings",
};

/** Where on the sheet a field stands, as a technician would say it: "26-0147/3, 2 ms, run 2". */
export function describeField(field: string, sheet: Pick<Sheet, "columns" | "rows" | "repeats">): string {
  const [kind = "", first = "", second = "", third = ""] = field.split(".");
  if (plain[field]) return plain[field];
  if (kind === "conditions" || kind === "checks") return "Conditions";
  if (kind === "column") return columnName(sheet, first);
  const tag =
    sheet.rows.find((row) => row.setInjectorId === first)?.tag ?? "An injector no longer in the set";
  if (kind !== "reading") return tag;
  const run = sheet.repeats > 1 ? `, run ${third}` : "";
  return `${tag}, ${columnName(sheet, second)}${run}`;
}

function columnName(sheet: Pick<Sheet, "columns">, columnId: string): string {
  const column = sheet.columns.find((candidate) => candidate.id === columnId);
  if (column?.heldOpen) return "held open";
  return column?.pulseWidthMs ? `${column.pulseWidthMs} ms` : "a column without a width";
}
