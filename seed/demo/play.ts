import { calibrateBench } from "../factories/benches";
import type { RecordClock } from "../record-clock";
import { dayOf, daysAfter, daysBefore, type Happening, runTimeline } from "../timeline";
import { addBenches, type DemoBench } from "./benches";
import { courseOf } from "./course";
import { addCustomers } from "./customers";
import { describeLab } from "./lab";
import { addDemoCustomerPerson, addStaff, type Staff } from "./people";
import { planSets } from "./plan-sets";
import type { World } from "./world";

const beginsDaysAgo = 430;

/** Fourteen months of an invented lab, the same for the same day. */
export async function playDemo(clock: RecordClock, say: (line: string) => void): Promise<void> {
  const now = new Date();
  await clock.setTo(daysBefore(now, beginsDaysAgo, 8));
  const staff = await addStaff();
  const lab = await describeLab(staff.manager.context);
  const customers = await addCustomers(staff.counter.context);
  await addDemoCustomerPerson(customers[0]!);
  const benches = await addBenches(staff.manager.context, lab.fluidId, daysBefore(now, beginsDaysAgo, 8));
  const world: World = { now, staff, ...lab, customers, benches };
  const sets = planSets(world).map((plan) => courseOf(world, plan));
  await runTimeline([...sets.flat(), ...calibrating(now, staff, benches)], clock, (done, of) => {
    if (done % 40 === 0 || done === of) say(`${Math.round((100 * done) / of)} % of fourteen months`);
  });
}

/** The yearly calibrations of the benches in daily use; the last bench was forgotten. */
function calibrating(now: Date, { manager }: Staff, benches: DemoBench[]): Happening[] {
  return benches
    .filter(({ recalibratedDaysAgo }) => recalibratedDaysAgo !== null)
    .map(({ recalibratedDaysAgo, benchId, code }) => {
      const at = daysBefore(now, recalibratedDaysAgo!, 7, 15);
      return {
        at,
        what: () =>
          calibrateBench(manager.context, {
            benchId,
            code,
            validFrom: dayOf(at),
            validUntil: dayOf(daysAfter(at, 364)),
            takeOver: true,
          }),
      };
    });
}
