import { sendToReview } from "../../src/data/cycles";
import { addPhoto } from "../../src/data/photos";
import {
  getSet,
  handOverSet,
  holdSet,
  rejectInjector,
  replaceInjector,
  returnSetUncleaned,
} from "../../src/data/sets";
import type { Phase, Stage } from "../../src/db/vocabulary";
import { keyed } from "../factories/acting";
import { recordSyntheticCycle } from "../factories/cycles";
import { checkIn } from "../factories/sets";
import { clean, release } from "../factories/steps";
import { makeSetTruth } from "../factories/synthetic-bench";
import { dayOf, daysAfter, daysBefore, type Happening, workdaysAfter } from "../timeline";
import type { SetPlan } from "./plan-sets";
import { drawSpray } from "./spray-photo";
import type { World } from "./world";

/** Days after check-in and the hour at which a step usually happens. */
const usual: { stage: Stage; days: number; hour: number }[] = [
  { stage: "checked in", days: 0, hour: 8 },
  { stage: "as found", days: 1, hour: 9 },
  { stage: "cleaning", days: 1, hour: 13 },
  { stage: "as left", days: 2, hour: 10 },
  { stage: "in review", days: 2, hour: 15 },
  { stage: "certified", days: 3, hour: 11 },
  { stage: "handed over", days: 4, hour: 16 },
];

/** A set that came lately is placed by plain days, so that it is where it should be on whatever day the demo is made. */
const lately = 14;

/** What happens to a planned set, up to where it has come. */
export function courseOf(world: World, plan: SetPlan): Happening[] {
  const steps = stepsOf(world, plan);
  const last = usual.findIndex(({ stage }) => stage === plan.reached);
  const happenings = usual
    .slice(0, last + 1)
    .map(
      ({ stage, days, hour }): Happening => ({ at: momentOf(world, plan, days, hour), what: steps[stage] }),
    );
  return [...happenings, ...asideOf(world, plan, steps)];
}

function momentOf(
  { now }: World,
  { checkedInDaysAgo, pace, serial }: SetPlan,
  days: number,
  hour: number,
): Date {
  const minute = (serial * 7) % 60;
  const later = hour + (serial % 3 === 0 ? 1 : 0);
  const daysLater = Math.round(days * pace);
  if (checkedInDaysAgo > lately)
    return workdaysAfter(daysBefore(now, checkedInDaysAgo, 0), daysLater, later, minute);
  const at = daysBefore(now, Math.max(0, checkedInDaysAgo - daysLater), later, minute);
  // What is planned for this afternoon happened a while ago all the same.
  return at < now ? at : new Date(now.getTime() - 20 * 60_000);
}

function asideOf(world: World, plan: SetPlan, { hold }: ReturnType<typeof stepsOf>): Happening[] {
  return plan.hold ? [{ at: daysBefore(world.now, plan.checkedInDaysAgo - 2, 14, 20), what: hold }] : [];
}

/** The steps of one set, each by who does it. */
function stepsOf(world: World, plan: SetPlan) {
  const { manager, counter, technicians } = world.staff;
  const technician = technicians[plan.serial % 2]!.context;
  const benchId = world.benches[plan.serial % 2]!.benchId;
  const truth = makeSetTruth(plan.serial * 101, plan.serials.length, plan.model);
  let setId = "";

  async function measure(phase: Phase): Promise<void> {
    const truths = phase === "as found" ? truth.asFound : truth.asLeft;
    await recordSyntheticCycle(technician, {
      setId,
      phase,
      benchId,
      truths,
      seed: plan.serial * 10 + (phase === "as found" ? 1 : 2),
    });
    if (plan.photographed) await photograph(phase);
  }

  async function photograph(phase: Phase): Promise<void> {
    const { injectors } = await getSet(technician, { setId });
    for (const [place, { setInjectorId, tag }] of injectors.filter(isInSet).entries()) {
      const { sprayGrade } = (phase === "as found" ? truth.asFound : truth.asLeft)[place]!;
      const file = new Uint8Array(await drawSpray(plan.serial * 50 + place, sprayGrade));
      const name = `spray ${tag.replace("/", "-")}.jpg`;
      await addPhoto(technician, keyed({ setId, setInjectorId, kind: "spray", phase, name, file }));
    }
  }

  async function replace({ position, reason }: NonNullable<SetPlan["rejects"]>): Promise<void> {
    const { injectors } = await getSet(technician, { setId });
    const { setInjectorId } = injectors.find((injector) => injector.position === position)!;
    await rejectInjector(technician, keyed({ setInjectorId, reason }));
    await replaceInjector(
      technician,
      keyed({
        setInjectorId,
        serial: `9${plan.serial}07`,
        marking: "from the shelf",
        condition: "sound",
        conditionNote: "",
      }),
    );
  }

  return {
    "checked in": async () => {
      const at = momentOf(world, plan, 0, 8);
      ({ setId } = await checkIn(counter.context, {
        customerId: plan.customerId,
        modelId: plan.model.modelId,
        toleranceClassId: plan.toleranceClassId,
        promisedOn: dayOf(daysAfter(at, plan.promisedAfterDays)),
        serials: plan.serials,
      }));
    },
    "as found": () => measure("as found"),
    cleaning: async () => {
      if (plan.returned) return returnSetUncleaned(counter.context, keyed({ setId, reason: plan.returned }));
      if (plan.rejects) await replace(plan.rejects);
      return clean(technician, setId, `D-${110 + Math.floor(plan.serial / 12)}`);
    },
    "as left": async () => (plan.returned ? undefined : measure("as left")),
    "in review": async () => (plan.returned ? undefined : sendToReview(technician, keyed({ setId }))),
    certified: async () => (plan.returned ? undefined : release(manager.context, setId)),
    "handed over": () =>
      handOverSet(
        counter.context,
        keyed({
          setId,
          takenBy: plan.serial % 4 === 0 ? "Harbour Couriers" : "The customer in person",
          way: plan.serial % 4 === 0 ? "courier" : "collected",
          consignment: plan.serial % 4 === 0 ? `HC-${70_000 + plan.serial}` : "",
        }),
      ),
    "returned uncleaned": async () => undefined,
    hold: async () => (plan.hold ? holdSet(counter.context, keyed({ setId, reason: plan.hold })) : undefined),
  };
}

function isInSet({ state }: { state: string }): boolean {
  return state === "in set";
}
