import type { InjectorCondition, SetInjector } from "@/data/sets";
import { mostInjectors, sameSerial } from "@/data/sets/inputs";

/** One injector as it is typed. */
export type IntakeRow = {
  /** Stays with the row while others come and go. */
  key: number;
  setInjectorId: string;
  /** Null before the set has a number. */
  tag: string | null;
  serial: string;
  marking: string;
  condition: InjectorCondition;
  conditionNote: string;
  notReceived: boolean;
};

let lastKey = 0;

export function newRow(condition: InjectorCondition = "sound"): IntakeRow {
  lastKey += 1;
  return {
    key: lastKey,
    setInjectorId: "",
    tag: null,
    serial: "",
    marking: "",
    condition,
    conditionNote: "",
    notReceived: false,
  };
}

/** As many rows as injectors: added at the end, taken away from the end. */
export function withCount(rows: IntakeRow[], count: number): IntakeRow[] {
  const wanted = Math.max(1, Math.min(mostInjectors, count));
  if (wanted <= rows.length) return rows.slice(0, wanted);
  return [...rows, ...Array.from({ length: wanted - rows.length }, () => newRow(rows.at(-1)?.condition))];
}

export function changed(rows: IntakeRow[], key: number, part: Partial<IntakeRow>): IntakeRow[] {
  return rows.map((row) => (row.key === key ? { ...row, ...part } : row));
}

/** The condition of one row for all rows below it. */
export function filledDown(rows: IntakeRow[], key: number): IntakeRow[] {
  const from = rows.findIndex((row) => row.key === key);
  const source = rows[from];
  return source ? rows.map((row, at) => (at > from ? { ...row, condition: source.condition } : row)) : rows;
}

/**
 * A column of serials from a spreadsheet or a scanner's list, put in from one row on; a second column is the marking. Rows
 * are added as needed. Null when what was pasted is no more than one cell.
 */
export function pastedSerials(rows: IntakeRow[], key: number, text: string): IntakeRow[] | null {
  const lines = text.replace(/\r\n?/g, "\n").replace(/\n+$/, "").split("\n");
  if (lines.length < 2 && !text.includes("\t")) return null;
  const from = rows.findIndex((row) => row.key === key);
  const grown = rows.length < from + lines.length ? withCount(rows, from + lines.length) : rows;
  return grown.map((row, at) => {
    const line = at >= from ? lines[at - from] : undefined;
    if (line === undefined) return row;
    const [serial = "", marking] = line.split("\t").map((cell) => cell.trim());
    return { ...row, serial, marking: marking ?? row.marking };
  });
}

/** For each row the number of an earlier row with the same serial, or null. */
export function repeatedSerials(rows: IntakeRow[]): (number | null)[] {
  return rows.map((row, at) => {
    if (!row.serial.trim()) return null;
    const first = rows.findIndex((other) => other.serial.trim() && sameSerial(other.serial, row.serial));
    return first < at ? first + 1 : null;
  });
}

/** An injector that is in the set already. */
export function rowOf({
  setInjectorId,
  tag,
  serial,
  marking,
  condition,
  conditionNote,
}: SetInjector): IntakeRow {
  return {
    ...newRow(condition),
    setInjectorId,
    tag: tag.slice(tag.lastIndexOf("/") + 1),
    serial: serial ?? "",
    marking,
    conditionNote,
  };
}
