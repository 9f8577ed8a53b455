import "server-only";
import { sql } from "drizzle-orm";
import { activity } from "../../db/schema/activity";

const id = sql`${activity.objectId}::uuid`;

/** What an event happened to, as it is called today. A set has a column of its own. */
export const objectName = sql<string | null>`case ${activity.noun}
  when 'person' then (select name from people where person_id = ${id})
  when 'customer' then (select name from customers where customer_id = ${id})
  when 'model' then (select make || ' ' || part_number from injector_models where injector_model_id = ${id})
  when 'tolerance class' then (select name from tolerance_classes where tolerance_class_id = ${id})
  when 'fluid' then (select name from fluids where fluid_id = ${id})
  when 'bench' then (select 'bench ' || code from benches where bench_id = ${id})
  when 'instrument' then (select code from instruments where instrument_id = ${id})
  when 'calibration' then (select reference from calibrations where calibration_id = ${id})
  when 'certificate' then (select number from certificates where certificate_id = ${id})
end`;
