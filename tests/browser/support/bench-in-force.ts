import postgres from "postgres";
import type { Correction } from "../../support/independent-figures";

type Row = {
  kind: string;
  number: number | null;
  gain: string;
  offset: string;
  division: string;
};

/** The calibrations in force on a bench now, as they stand in the tables. */
export async function benchInForce(code: string) {
  const sql = postgres(process.env.DATABASE_URL!, { max: 1 });
  try {
    const rows = await sql<Row[]>`
      select i.kind, c.number, k.gain, k.offset_value as "offset", i.division
        from benches b
        join bench_instruments p using (bench_id)
        join instruments i using (instrument_id)
        join calibrations k using (instrument_id)
        left join bench_channels c on c.bench_channel_id = p.bench_channel_id
       where b.code = ${code} and p.until_at is null and k.ended_at is null
         and now() between k.valid_from and k.valid_until
       order by c.number`;
    const ofKind = (kind: string) => correctionOf(rows.find((row) => row.kind === kind));
    return {
      channels: rows.filter((row) => row.number !== null).map(correctionOf),
      divisionMl: Number(rows.find((row) => row.number !== null)?.division),
      instruments: {
        gauge: ofKind("pressure gauge"),
        thermometer: ofKind("thermometer"),
        timer: ofKind("pulse timer"),
        ohmmeter: ofKind("ohmmeter"),
      },
    };
  } finally {
    await sql.end();
  }
}

function correctionOf(row: Row | undefined): Correction {
  if (!row) throw new Error("An instrument has no calibration in force");
  return { gain: Number(row.gain), offset: Number(row.offset) };
}
