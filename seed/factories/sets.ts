import type { Context } from "../../src/data/access/actor";
import { checkInSet, getSet } from "../../src/data/sets";
import type { injectorConditions, workItems } from "../../src/db/vocabulary";
import { keyed } from "./acting";

type Checking = {
  customerId: string;
  modelId: string;
  toleranceClassId: string;
  promisedOn: string;
  serials?: readonly (string | null)[];
  condition?: (typeof injectorConditions)[number];
  workAsked?: readonly (typeof workItems)[number][];
  customerRequest?: string;
  internalNote?: string;
};

/** Checks a set in as the counter does; answers with its injectors in the order of their tags. */
export async function checkIn(counter: Context, checking: Checking) {
  const { customerId, modelId, serials = [null, null, null, null], condition = "dirty", ...asked } = checking;
  const { setId } = await checkInSet(
    counter,
    keyed({
      customer: { is: "known", customerId },
      model: { is: "known", modelId },
      workAsked: ["clean", "flow test", "match"],
      customerRequest: "",
      internalNote: "",
      ...asked,
      injectors: serials.map((serial, index) => ({
        serial: serial ?? "",
        marking: `cylinder ${index + 1}`,
        condition,
        conditionNote: "",
      })),
    }),
  );
  const { number, injectors } = await getSet(counter, { setId });
  return { setId, number, injectors };
}
