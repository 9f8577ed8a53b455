import postgres from "postgres";

export type RecordClock = {
  /** What the database takes for now from here on. */
  setTo: (at: Date) => Promise<void>;
  /** Gives the database its own time back. */
  end: () => Promise<void>;
};

/** The demo's history lies in the past, so its records are written while the database's clock is shifted back. */
export function openRecordClock(ownerUrl: string): RecordClock {
  const sql = postgres(ownerUrl, { max: 1, onnotice: () => {} });
  return {
    setTo: async (at) => {
      await sql`
        insert into record_clock (shift) values (${at.toISOString()}::timestamptz - now())
        on conflict (only_row) do update set shift = excluded.shift`;
    },
    end: async () => {
      await sql`delete from record_clock`;
      await sql.end();
    },
  };
}
