import { z } from "zod";
import { baseVersion, decimal, id, optionalDecimal, text, tick, writeInput } from "../fields";

const pulseWidth = decimal({
  label: "Pulse width",
  low: 0,
  high: 1000,
  decimals: 4,
  unit: "ms",
});

/** What a class asks. A limit left empty is not judged. */
const limitFields = {
  staticSpreadPercent: optionalDecimal({
    label: "Static flow spread",
    low: 0.01,
    high: 100,
    decimals: 3,
    unit: "%",
  }),
  deadTimeRangeMs: optionalDecimal({
    label: "Dead time range",
    low: 0.0001,
    high: 10,
    decimals: 4,
    unit: "ms",
  }),
  resistanceRangeOhm: optionalDecimal({
    label: "Resistance range",
    low: 0.001,
    high: 100,
    decimals: 3,
    unit: "Ω",
  }),
  leakageLimitMm3PerMin: optionalDecimal({
    label: "Leakage limit",
    low: 0,
    high: 1000,
    decimals: 2,
    unit: "mm³/min",
  }),
  limits: z
    .array(
      z.object({
        fromPulseWidthMs: pulseWidth,
        spreadPercent: decimal({ label: "Spread", low: 0.01, high: 100, decimals: 3, unit: "%" }),
      }),
    )
    .max(20, "A class has at most 20 spread limits.")
    .default([])
    .superRefine(refuseRepeatedWidths),
};

function refuseRepeatedWidths(
  limits: { fromPulseWidthMs: number }[],
  context: z.RefinementCtx<{ fromPulseWidthMs: number }[]>,
): void {
  const seen = new Set<number>();
  for (const [index, { fromPulseWidthMs }] of limits.entries()) {
    if (seen.has(fromPulseWidthMs))
      context.addIssue({
        code: "custom",
        path: [index, "fromPulseWidthMs"],
        message: `Pulse width ${fromPulseWidthMs} ms stands here twice.`,
      });
    seen.add(fromPulseWidthMs);
  }
}

const name = text({ label: "Class name", longest: 80 });

export const addToleranceClassInput = writeInput({ name, ...limitFields });
export const reviseToleranceClassInput = writeInput({
  toleranceClassId: id("tolerance class"),
  version: baseVersion,
  ...limitFields,
});
export const setToleranceClassRetiredInput = writeInput({
  toleranceClassId: id("tolerance class"),
  retired: tick(),
});
export const listToleranceClassesInput = z
  .object({ withRetired: z.boolean().catch(false) })
  .nullish()
  .transform((typed) => typed ?? { withRetired: false });
export const getToleranceClassInput = z.object({ toleranceClassId: id("tolerance class") });
