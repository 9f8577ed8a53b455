import { z } from "zod";
import { handOverWays, injectorConditions, stages, workItems } from "../../db/vocabulary";
import { customerFields } from "../customers/inputs";
import {
  baseVersion,
  choice,
  choices,
  day,
  id,
  optionalText,
  page,
  reason,
  searched,
  text,
  tick,
  writeInput,
} from "../fields";
import { modelFields, resistancesInOrder, resistancesOutOfOrder } from "../models/inputs";

export const mostInjectors = 48;

const injectorFields = {
  serial: optionalText({ label: "Serial", longest: 60 }).transform((typed) => typed || null),
  marking: optionalText({ label: "Marking", longest: 60 }),
  condition: choice("Condition", injectorConditions),
  conditionNote: optionalText({ label: "Note on the condition", longest: 500, lines: "many" }),
};

const askedFields = {
  toleranceClassId: id("tolerance class"),
  workAsked: choices("Work asked for", workItems, 1),
  promisedOn: day("Promised day"),
  customerRequest: optionalText({ label: "Customer's request", longest: 2000, lines: "many" }),
  internalNote: optionalText({ label: "Internal note", longest: 4000, lines: "many" }),
};

/** Two serials are the same injector's whatever the case they are typed in. */
export function sameSerial(one: string, other: string): boolean {
  return one.trim().toUpperCase() === other.trim().toUpperCase();
}

/** Marks every serial that stands above in the same list. */
function serialsOnce(injectors: { serial: string | null }[], context: z.RefinementCtx): void {
  injectors.forEach(({ serial }, at) => {
    const first = injectors.findIndex((other) => serial && other.serial && sameSerial(other.serial, serial));
    if (first < 0 || first === at) return;
    context.addIssue({
      code: "custom",
      path: [at, "serial"],
      message: `Injector ${first + 1} has the same serial.`,
    });
  });
}

/** An existing customer, or the data of a new one. */
const customerChoice = z.discriminatedUnion(
  "is",
  [
    z.object({ is: z.literal("known"), customerId: id("customer") }),
    z.object({ is: z.literal("new"), ...customerFields }),
  ],
  { error: "Please choose a customer." },
);

/** An existing injector model, or the data of a new one. */
const modelChoice = z.discriminatedUnion(
  "is",
  [
    z.object({ is: z.literal("known"), modelId: id("model") }),
    z.object({ is: z.literal("new"), ...modelFields }).refine(resistancesInOrder, resistancesOutOfOrder),
  ],
  { error: "Please choose an injector model." },
);

export const checkInSetInput = writeInput({
  customer: customerChoice,
  model: modelChoice,
  ...askedFields,
  injectors: z
    .array(z.object(injectorFields), { error: "A set has at least one injector." })
    .min(1, "A set has at least one injector.")
    .max(mostInjectors, `A set has at most ${mostInjectors} injectors.`)
    .superRefine(serialsOnce),
});

const changedInjector = z.object({
  /** Missing for one that was found in the parcel afterwards. */
  setInjectorId: z.preprocess((value) => value || undefined, id("injector").optional()),
  ...injectorFields,
  /** Booked in, but not in the parcel: stays on record as rejected. */
  notReceived: tick(),
});

export const editIntakeInput = writeInput({
  setId: id("set"),
  version: baseVersion,
  modelId: id("model"),
  ...askedFields,
  injectors: z
    .array(changedInjector, { error: "A set has at least one injector." })
    .max(mostInjectors * 2, `A set has at most ${mostInjectors} injectors.`)
    .superRefine(serialsOnce),
  /** Asked for once the set has been measured. */
  reason: optionalText({ label: "Reason", longest: 500, lines: "many" }),
});

export const holdSetInput = writeInput({ setId: id("set"), reason: reason() });
export const clearSetHoldInput = holdSetInput;
export const returnSetUncleanedInput = holdSetInput;
export const handOverSetInput = writeInput({
  setId: id("set"),
  takenBy: text({ label: "Taken by", longest: 160 }),
  way: choice("Way", handOverWays),
  consignment: optionalText({ label: "Consignment number", longest: 80 }),
});

export const getSetInput = z.object({ setId: id("set") });
export const bagLabelSizes = ["62x29", "100x50", "a4", "letter"] as const;
export const getBagLabelsInput = getSetInput.extend({ size: z.enum(bagLabelSizes).catch("62x29") });
export const findSetInput = z.object({ typed: searched(2000) });
export const findKnownInjectorsInput = z.object({
  modelId: id("model"),
  serials: z.array(searched(200)).max(mostInjectors),
});

export const setViews = ["in the lab", "late", "on hold", "ready to leave", "handed over", "all"] as const;
export const setSorts = ["number", "customer", "model", "stage", "promisedOn", "checkedInAt"] as const;

/** A list never refuses what its address says: what it does not know is left out. */
export const listSetsInput = page.extend({
  view: z.enum(setViews).catch("in the lab"),
  stage: z.enum(stages).optional().catch(undefined),
  customerId: z.uuid().optional().catch(undefined),
  search: searched(),
  sort: z.enum(setSorts).catch("promisedOn"),
  descending: z
    .enum(["true", "false"])
    .catch("false")
    .transform((typed) => typed === "true"),
});
