import { checkIn } from "../factories/sets";
import { dayOf, daysAfter, type Happening, workMoment } from "../timeline";
import type { SetPlan } from "./plan-sets";
import type { World } from "./world";

/** What happens to a planned set, up to where it has come. */
export function courseOf(world: World, plan: SetPlan): Happening[] {
  const at = workMoment(world.now, plan.checkedInDaysAgo, 8 + (plan.serial % 3), (plan.serial * 7) % 60);
  return [
    {
      at,
      what: () =>
        checkIn(world.staff.counter.context, {
          customerId: plan.customerId,
          modelId: plan.model.modelId,
          toleranceClassId: plan.toleranceClassId,
          promisedOn: dayOf(daysAfter(at, plan.promisedAfterDays)),
          serials: plan.serials,
        }),
    },
  ];
}
