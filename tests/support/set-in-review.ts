import { keyed } from "../../seed/factories/acting";
import { recordSyntheticCycle } from "../../seed/factories/cycles";
import { dayFromNow, type Lab } from "../../seed/factories/lab";
import { checkIn } from "../../seed/factories/sets";
import { clean } from "../../seed/factories/steps";
import { makeSetTruth } from "../../seed/factories/synthetic-bench";
import { sendToReview } from "../../src/data/cycles";
import type { Phase } from "../../src/db/vocabulary";

type Wanted = { count?: number; customerId?: string; internalNote?: string };

/** A set that its technician has measured, cleaned, measured again and sent to review. */
export async function setInReview(lab: Lab, { count = 4, customerId, internalNote }: Wanted = {}) {
  const technician = lab.technician.context;
  const { setId, number, injectors } = await checkIn(lab.counter.context, {
    customerId: customerId ?? lab.customer,
    modelId: lab.modelId,
    toleranceClassId: lab.toleranceClassId,
    promisedOn: dayFromNow(5),
    serials: Array<null>(count).fill(null),
    internalNote,
  });
  const truth = makeSetTruth(7, count, { ratedFlowMlPerMin: 440, ohms: 12 });
  const measure = (phase: Phase, truths: typeof truth.asFound, seed: number) =>
    recordSyntheticCycle(technician, { setId, phase, benchId: lab.bench.benchId, truths, seed });
  await measure("as found", truth.asFound, 1);
  await clean(technician, setId);
  await measure("as left", truth.asLeft, 2);
  await sendToReview(technician, keyed({ setId }));
  return { setId, number, injectors };
}
