import type postgres from "postgres";
import { makeLab } from "../../seed/factories/lab";
import { release } from "../../seed/factories/steps";
import type { Context } from "../../src/data/access/actor";
import { presentResults } from "../../src/data/certificates";
import { getSetResults } from "../../src/data/cycles";
import { getSet } from "../../src/data/sets";
import { closeDatabase } from "../../src/db/client";
import { connect } from "../../src/db/connect";
import { settings } from "../../src/settings";
import { setInReview } from "../support/set-in-review";
import { type BenchTable, inMs, ratio, sideBySide } from "./measure";

/** What the page of a certified set of eight reads and works out, against nothing but the rows of it. */
export async function benchSetPage(): Promise<BenchTable[]> {
  const lab = await makeLab();
  const { setId } = await setInReview(lab, { count: 8 });
  await release(lab.manager.context, setId);
  const { DATABASE_URL, DATABASE_POOL } = settings();
  const sql = connect(DATABASE_URL, DATABASE_POOL);
  try {
    const measured = await sideBySide([
      { name: "the page's data: rows, figures, verdicts", run: () => pageData(lab.manager.context, setId) },
      { name: "its reads without the results (getSet)", run: () => getSet(lab.manager.context, { setId }) },
      { name: "bare SQL: every row it needs", run: () => bareRows(sql, setId) },
    ]);
    return [
      {
        title: "Page of a set, 8 injectors, 7 pulse widths, as found and as left",
        head: ["", "one call", "the page's data take"],
        rows: measured.map((way) => [way.name, inMs(way.medianMs), ratio(measured[0]!, way)]),
        notes: [
          "Medians of 31 alternating rounds on loopback. Beyond the rows the page has the right to them checked, 16 flow lines",
          "with ranges and intervals, and every spread's interval from 4000 draws; figures are worked out anew each time.",
        ],
      },
    ];
  } finally {
    await sql.end();
    await closeDatabase();
  }
}

async function pageData(context: Context, setId: string) {
  const [set, results] = await Promise.all([getSet(context, { setId }), getSetResults(context, { setId })]);
  return presentResults(set, results);
}

/** Side by side on a pool as large as the application's. */
function bareRows(sql: postgres.Sql, setId: string) {
  const ofSet = sql`select cycle_revision_id from cycle_revisions join cycles using (cycle_id) where set_id = ${setId}`;
  const used = sql`calibrations k join instruments i using (instrument_id)`;
  return Promise.all([
    sql`select s.*, c.name, c.contact_name, c.email, c.phone, m.*, l.reference_fluid, l.reference_density_g_per_ml
          from sets s join customers c using (customer_id) join injector_models m using (injector_model_id)
          join lab_details l on true where s.set_id = ${setId}`,
    sql`select t.name, r.*, n.from_pulse_width_ms, n.spread_percent
          from sets s join tolerance_classes t using (tolerance_class_id)
          join tolerance_class_revisions r using (tolerance_class_id)
          left join tolerance_class_limits n using (tolerance_class_revision_id) where s.set_id = ${setId}`,
    sql`select s.*, i.serial from set_injectors s join injectors i using (injector_id) where s.set_id = ${setId}`,
    sql`select t.*, p.name from set_steps t join people p using (person_id) where t.set_id = ${setId}`,
    sql`select * from set_holds where set_id = ${setId}`,
    sql`select * from photos where set_id = ${setId}`,
    sql`select * from hand_overs where set_id = ${setId}`,
    sql`select r.*, c.phase, c.number, b.code, b.location, f.name, p.name as recorded_by_name
          from cycle_revisions r join cycles c using (cycle_id) join benches b using (bench_id)
          join fluids f on f.fluid_id = r.fluid_id join people p on p.person_id = r.recorded_by where c.set_id = ${setId}`,
    sql`select u.*, h.number, k.*, i.* from cycle_injectors u join bench_channels h using (bench_channel_id)
          join (${used}) using (calibration_id) where u.cycle_revision_id in (${ofSet})`,
    sql`select u.*, k.*, i.* from cycle_instruments u join (${used}) using (calibration_id)
          where u.cycle_revision_id in (${ofSet})`,
    sql`select * from readings where cycle_revision_id in (${ofSet})`,
    sql`select * from injector_checks where cycle_revision_id in (${ofSet})`,
    sql`select c.*, p.name from cleaning_runs c join people p on p.person_id = c.recorded_by where c.set_id = ${setId}`,
  ]);
}
