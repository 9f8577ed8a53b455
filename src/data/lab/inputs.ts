import { z } from "zod";
import { paperSizes } from "../../db/vocabulary";
import {
  baseVersion,
  choice,
  decimal,
  email,
  optionalDecimal,
  optionalText,
  text,
  tick,
  wholeNumber,
  writeInput,
} from "../fields";

const plannedWidth = z.object({
  pulseWidthMs: decimal({ label: "Pulse width", low: 0.05, high: 1000, decimals: 4, unit: "ms" }),
  pulseCount: wholeNumber({ label: "Pulse count", low: 1, high: 1_000_000 }),
});

export const labFields = {
  name: text({ label: "Lab's name", longest: 160 }),
  address: optionalText({ label: "Address", longest: 600, lines: "many" }),
  phone: optionalText({ label: "Phone", longest: 60 }),
  email: z
    .literal("")
    .optional()
    .transform(() => "")
    .or(email()),
  accreditation: optionalText({ label: "Accreditation", longest: 600, lines: "many" }),
  certificateWording: optionalText({ label: "Certificate wording", longest: 4000, lines: "many" }),
  timeZone: text({ label: "Time zone", longest: 60 }).refine(
    isTimeZone,
    "Time zone is a name such as Europe/Berlin or UTC.",
  ),
  paperSize: choice("Paper", paperSizes),
  releaserIsAnother: tick(),
  referenceFluid: text({ label: "Reference fluid", longest: 120 }),
  referenceDensityGPerMl: decimal({
    label: "Reference density",
    low: 0.4,
    high: 1.2,
    decimals: 6,
    unit: "g/mL",
  }),
  widths: z
    .array(plannedWidth)
    .min(3, "The test plan has at least three pulse widths: a line needs them.")
    .max(14, "The test plan has at most 14 pulse widths.")
    .superRefine(refuseRepeatedWidths),
  heldOpenSeconds: optionalDecimal({
    label: "Held open",
    low: 0.1,
    high: 3600,
    decimals: 3,
    unit: "s",
  }),
};

function isTimeZone(name: string): boolean {
  if (!/^[A-Za-z]/.test(name)) return false;
  try {
    new Intl.DateTimeFormat("en", { timeZone: name });
    return true;
  } catch {
    return false;
  }
}

function refuseRepeatedWidths(
  widths: { pulseWidthMs: number }[],
  context: z.RefinementCtx<{ pulseWidthMs: number }[]>,
): void {
  for (const [index, { pulseWidthMs }] of widths.entries())
    if (widths.findIndex((other) => other.pulseWidthMs === pulseWidthMs) < index)
      context.addIssue({
        code: "custom",
        path: [index, "pulseWidthMs"],
        message: `Pulse width ${pulseWidthMs} ms stands in the plan twice.`,
      });
}

export const editLabDetailsInput = writeInput({ version: baseVersion, ...labFields });
