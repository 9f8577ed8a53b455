import { z } from "zod";
import { day, decimal, id, optionalText, reason, text, tick, writeInput } from "../fields";

const figures = {
  reference: text({ label: "Reference", longest: 80 }),
  gain: decimal({ label: "Gain", low: 0.5, high: 2, decimals: 9 }),
  offset: decimal({ label: "Offset", low: -10_000, high: 10_000, decimals: 8 }),
  gainU: decimal({ label: "u(gain)", low: 0, high: 0.5, decimals: 9 }),
  offsetU: decimal({ label: "u(offset)", low: 0, high: 10_000, decimals: 8 }),
};

const entry = z
  .object({
    instrumentId: id("instrument"),
    ...figures,
    validFrom: day("Valid from"),
    validUntil: day("Valid until"),
    note: optionalText({ label: "Note", longest: 1000, lines: "many" }),
  })
  .refine(({ validFrom, validUntil }) => validFrom <= validUntil, {
    path: ["validUntil"],
    message: "Valid until is not before valid from.",
  });

/** A row of the table in which nothing was typed stands for an instrument that was not calibrated. */
function isEmptyRow(row: unknown): boolean {
  const typed = (row ?? {}) as Record<string, unknown>;
  return Object.keys(figures).every((name) => String(typed[name] ?? "").trim() === "");
}

export const recordCalibrationsInput = writeInput({
  benchId: id("bench"),
  entries: z
    .array(z.preprocess((row) => (isEmptyRow(row) ? null : row), entry.nullable()))
    .max(60)
    .refine((rows) => rows.some((row) => row !== null), "Please fill in at least one instrument."),
  /** What was in force ends when these begin. */
  takeOver: tick(),
});

export const correctCalibrationInput = writeInput({
  calibrationId: id("calibration"),
  ...figures,
  validUntil: day("Valid until"),
  note: optionalText({ label: "Note", longest: 1000, lines: "many" }),
  reason: reason(),
});

export const revokeCalibrationInput = writeInput({ calibrationId: id("calibration"), reason: reason() });
