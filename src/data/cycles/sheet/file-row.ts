import { parseDecimal } from "../../../format/parse-decimal";

/** The columns of a file of readings, with their units. */
export const fileColumns = [
  "tag",
  "pulse_width_ms",
  "pulse_count",
  "open_seconds",
  "repeat",
  "amount_ml",
  "amount_g",
] as const;
export type FileColumn = (typeof fileColumns)[number];

/** One line of the file; numbers as texts with a decimal point. */
export type FileReading = {
  line: number;
  tag: string;
  pulseWidthMs: string;
  pulseCount: string;
  openSeconds: string;
  repeat: string;
  amount: string;
  collects: "volume" | "mass";
};
type Problem = { line: number; column: string | null; message: string };

type Row = { line: number; cells: string[] };

export function readFileRow(
  { line, cells }: Row,
  header: FileColumn[],
  decimalMark: "." | ",",
): { reading: FileReading } | { problems: Problem[] } {
  if (cells.length !== header.length) {
    const message = `The line has ${cells.length} columns, the header has ${header.length}.`;
    return { problems: [{ line, column: null, message }] };
  }
  const problems: Problem[] = [];
  const cell = (name: FileColumn) => cells[header.indexOf(name)]?.trim() ?? "";
  const number = (name: FileColumn) => {
    const text = cell(name);
    const message = text === "" ? null : numberProblem(text, decimalMark);
    if (message) problems.push({ line, column: name, message });
    return text.replace(",", ".");
  };
  const collects = header.includes("amount_g") ? "mass" : "volume";
  const reading: FileReading = {
    line,
    tag: cell("tag"),
    pulseWidthMs: number("pulse_width_ms"),
    pulseCount: number("pulse_count"),
    openSeconds: number("open_seconds"),
    repeat: number("repeat") || "1",
    amount: number(collects === "mass" ? "amount_g" : "amount_ml"),
    collects,
  };
  problems.push(...incomplete(reading));
  return problems.length > 0 ? { problems } : { reading };
}

function numberProblem(text: string, decimalMark: "." | ","): string | null {
  const other = decimalMark === "." ? "," : ".";
  if (text.includes(other))
    return `“${text}” is not written with a decimal ${decimalMark === "." ? "point" : "comma"}, as was declared.`;
  const parsed = parseDecimal(text);
  return parsed.ok ? null : parsed.problem;
}

function incomplete(reading: FileReading): Problem[] {
  const { line, tag, pulseWidthMs, pulseCount, openSeconds, amount, collects } = reading;
  const problems: Problem[] = [];
  const say = (column: FileColumn, message: string) => problems.push({ line, column, message });
  if (tag === "") say("tag", "The tag is missing.");
  if (amount === "") say(collects === "mass" ? "amount_g" : "amount_ml", "The amount is missing.");
  if (pulseWidthMs === "" && openSeconds === "")
    say("pulse_width_ms", "Neither a pulse width nor a time held open stands here.");
  if (pulseWidthMs !== "" && openSeconds !== "")
    say("open_seconds", "A reading is either pulsed or held open, not both.");
  if ((pulseWidthMs === "") !== (pulseCount === "")) say("pulse_count", "Width and count go together.");
  return problems;
}
