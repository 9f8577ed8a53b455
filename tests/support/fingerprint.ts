import { createHash } from "node:crypto";
import { asOwner } from "./databases";

/** Tables that change without anything of the record having changed. */
const asides = new Set(["sessions", "throttle_counters", "activity", "activity_head", "idempotency_keys"]);

/** One hash over every row of every table: nothing changed means equal fingerprints. */
export function fingerprint(): Promise<string> {
  return asOwner(async (sql) => {
    const tables = await sql<{ name: string }[]>`
      select table_name as name from information_schema.tables
       where table_schema = 'public' and table_type = 'BASE TABLE' order by 1`;
    const hash = createHash("sha256");
    for (const { name } of tables.filter((table) => !asides.has(table.name))) {
      const [row] = await sql<{ digest: string | null }[]>`
        select md5(string_agg(md5(t::text), '' order by md5(t::text))) as digest from ${sql(name)} t`;
      hash.update(`${name} ${row?.digest ?? ""}`);
    }
    return hash.digest("hex");
  });
}

/** What the activity record holds beyond a position. */
export function eventsAfter(position: number): Promise<{ event: string; after: unknown }[]> {
  return asOwner(
    (sql) => sql`select event, after from activity where position > ${position} order by position`,
  );
}

export async function lastPosition(): Promise<number> {
  const [row] = await asOwner(
    (sql) => sql<{ last: number }[]>`select coalesce(max(position), 0)::int as last from activity`,
  );
  return row!.last;
}
