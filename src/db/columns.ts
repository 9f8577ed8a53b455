import "server-only";
import { type SQL, sql } from "drizzle-orm";
import { type AnyPgColumn, check, integer, numeric, timestamp, uuid } from "drizzle-orm/pg-core";

/** A random public id; nothing can be guessed from a neighbour's. */
export function key(name: string) {
  return uuid(name).primaryKey().defaultRandom();
}

export function instant(name: string) {
  return timestamp(name, { withTimezone: true, mode: "date" });
}

/** The database's clock (see `record_clock` in the migrations): the only one that a stored time may come from. */
export const recordNow = sql<Date>`record_now()`;

/** An instant that the database sets, never the application or a client. */
export function recordedAt(name: string) {
  return instant(name).notNull().default(recordNow);
}

/** An exact decimal as it was read. A precision keeps infinities out; `between` keeps NaN out. */
export function measured(name: string, precision: number, scale: number) {
  return numeric(name, { precision, scale, mode: "number" });
}

/** The version an edit was based on. */
export function version() {
  return integer("version").notNull().default(1);
}

/** NaN sorts above every number in PostgreSQL, so only an upper bound refuses it. */
export function between(name: string, column: AnyPgColumn, low: number, high: number) {
  return check(name, sql`${column} between ${sql.raw(String(low))} and ${sql.raw(String(high))}`);
}

/** Text that is one of a closed list. */
export function oneOf(name: string, column: AnyPgColumn, words: readonly string[]) {
  return check(name, sql`${column} in (${quoted(words)})`);
}

/** A text array whose members are all of a closed list. */
export function allOf(name: string, column: AnyPgColumn, words: readonly string[]) {
  return check(name, sql`${column} <@ array[${quoted(words)}]::text[]`);
}

function quoted(words: readonly string[]): SQL {
  return sql.raw(words.map((word) => `'${word.replaceAll("'", "''")}'`).join(", "));
}

export function longest(name: string, column: AnyPgColumn, characters: number) {
  return check(name, sql`char_length(${column}) <= ${sql.raw(String(characters))}`);
}
