import "server-only";
import { sql } from "drizzle-orm";
import type { Transaction } from "../db/client";

/**
 * The next number of a series in the lab's own year: 26-0147. The series' row stays locked until the transaction ends, so
 * that numbers have no gaps: take it as late as possible.
 */
export async function takeNumber(transaction: Transaction, series: "set" | "certificate"): Promise<string> {
  const [taken] = await transaction.execute<{ year: number; last: number }>(sql`
    insert into number_series (series, year, last)
    select ${series}, extract(year from record_now() at time zone time_zone)::int, 1 from lab_details
    on conflict (series, year) do update set last = number_series.last + 1
    returning year, last`);
  if (!taken) throw new Error("The lab's details are missing: no year can be told");
  return `${String(taken.year % 100).padStart(2, "0")}-${String(taken.last).padStart(4, "0")}`;
}
