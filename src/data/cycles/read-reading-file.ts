import "server-only";
import { type CsvProblem, decodeCsv, mostProblems, readCsv } from "../read-csv";
import type { ReadingFileFormat } from "./inputs";
import { type FileColumn, type FileReading, fileColumns, readFileRow } from "./sheet/file-row";

export type ReadFile = { readings: FileReading[]; problems: CsvProblem[]; rows: number };

/** Reads a file of readings; each problem names line and column, and the first fifty are told. */
export async function readReadingFile(bytes: Uint8Array, format: ReadingFileFormat): Promise<ReadFile> {
  const decoded = decodeCsv(bytes);
  if ("problem" in decoded)
    return { readings: [], rows: 0, problems: [{ line: 1, column: null, message: decoded.problem }] };
  const found: ReadFile = { readings: [], problems: [], rows: 0 };
  let header: FileColumn[] | null = null;
  const broken = await readCsv(decoded.text.replace(/^\uFEFF/, ""), format.separator, (row) => {
    if (!header) {
      const read = readHeader(row.cells);
      found.problems.push(...read.problems);
      header = read.columns;
      return read.problems.length === 0;
    }
    found.rows += 1;
    const read = readFileRow(row, header, format.decimalMark);
    if ("problems" in read) found.problems.push(...read.problems);
    else found.readings.push(read.reading);
    return found.problems.length < mostProblems;
  });
  if (broken) found.problems.push(broken);
  if (found.rows === 0 && found.problems.length === 0)
    found.problems.push({ line: 1, column: null, message: "The file holds no readings." });
  return { ...found, problems: found.problems.slice(0, mostProblems) };
}

function readHeader(cells: string[]): { columns: FileColumn[]; problems: CsvProblem[] } {
  const names = cells.map((cell) => cell.trim().toLowerCase());
  const problems: CsvProblem[] = [];
  const say = (column: string | null, message: string) => problems.push({ line: 1, column, message });
  for (const [index, name] of names.entries()) {
    if (!(fileColumns as readonly string[]).includes(name))
      say(name || `column ${index + 1}`, `Unknown column. Known ones are ${fileColumns.join(", ")}.`);
    else if (names.indexOf(name) !== index) say(name, "The column stands twice.");
  }
  const has = (name: FileColumn) => names.includes(name);
  if (!has("tag")) say("tag", "The column is missing.");
  if (has("amount_ml") === has("amount_g")) say("amount_ml", "Either amount_ml or amount_g is needed.");
  if (has("pulse_width_ms") !== has("pulse_count"))
    say("pulse_count", "pulse_width_ms and pulse_count go together.");
  if (!has("pulse_width_ms") && !has("open_seconds"))
    say("pulse_width_ms", "Either pulse_width_ms with pulse_count or open_seconds is needed.");
  return { columns: names as FileColumn[], problems };
}
