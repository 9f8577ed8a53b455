import { z } from "zod";
import { events } from "../audit/events";
import { page } from "../fields";

const emptyIsMissing = (value: unknown) => (value === "" ? undefined : value);

/** A list never refuses what its address says: what it does not know is left out. */
export const listActivityInput = page.extend({
  personId: z.preprocess(emptyIsMissing, z.uuid().optional().catch(undefined)),
  setId: z.preprocess(emptyIsMissing, z.uuid().optional().catch(undefined)),
  event: z.preprocess(emptyIsMissing, z.enum(events).optional().catch(undefined)),
  from: z.preprocess(emptyIsMissing, z.iso.date().optional().catch(undefined)),
  until: z.preprocess(emptyIsMissing, z.iso.date().optional().catch(undefined)),
});
