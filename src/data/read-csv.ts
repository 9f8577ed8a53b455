import "server-only";
import { Readable } from "node:stream";
import { type CsvError, parse } from "csv-parse";

export type CsvProblem = { line: number; column: string | null; message: string };
export type CsvRow = { line: number; cells: string[] };

const mostRows = 200_000;
const mostColumns = 64;
export const mostProblems = 50;

/** Bytes as text, or what is wrong with them: UTF-8 with or without a byte order mark, and nothing else. */
export function decodeCsv(bytes: Uint8Array): { text: string } | { problem: string } {
  if (bytes.length === 0) return { problem: "The file is empty." };
  const [first, second] = bytes;
  if ((first === 0xff && second === 0xfe) || (first === 0xfe && second === 0xff))
    return { problem: "The file is UTF-16. Please save it as UTF-8." };
  try {
    const text = new TextDecoder("utf-8", { fatal: true }).decode(bytes);
    return text.includes("\0") ? { problem: "The file holds NUL characters; it is not a text." } : { text };
  } catch {
    return { problem: "The file is not UTF-8. Please save it as UTF-8." };
  }
}

/**
 * Hands over row by row, the header first. Stops at the first row that cannot be told apart, at too many rows, and when
 * `onRow` says so by returning false.
 */
export async function readCsv(
  text: string,
  separator: string,
  onRow: (row: CsvRow) => boolean,
): Promise<CsvProblem | null> {
  const parser = Readable.from(inPieces(text)).pipe(
    parse({ delimiter: separator, info: true, relax_column_count: true, skip_empty_lines: true }),
  );
  let rows = 0;
  try {
    for await (const { record, info } of parser as AsyncIterable<{
      record: string[];
      info: { lines: number };
    }>) {
      rows += 1;
      if (rows > mostRows + 1) return problemAt(info.lines, `More than ${mostRows} rows.`);
      if (record.length > mostColumns) return problemAt(info.lines, `More than ${mostColumns} columns.`);
      if (!onRow({ line: info.lines, cells: record })) return null;
    }
    return null;
  } catch (error) {
    return problemOf(error as CsvError);
  }
}

const pieceLength = 65_536;

function* inPieces(text: string): Generator<string> {
  for (let start = 0; start < text.length; start += pieceLength) yield text.slice(start, start + pieceLength);
}

function problemAt(line: number, message: string): CsvProblem {
  return { line, column: null, message };
}

function problemOf(error: CsvError): CsvProblem {
  const line = typeof error.lines === "number" ? error.lines : 1;
  if (error.code === "CSV_QUOTE_NOT_CLOSED")
    return problemAt(line, "A quotation mark is opened and never closed.");
  if (error.code?.startsWith("CSV_")) return problemAt(line, "A quotation mark stands where none may.");
  throw error;
}
