import { z } from "zod";
import { phases } from "../../db/vocabulary";
import { baseVersion, choice, id, idempotencyKey, reason, writeInput } from "../fields";
import { isDraftField } from "./draft-fields";

const unstorable = /(?![\t\n\r])\p{Cc}|\p{Cs}/u;

/** What was typed, right or wrong: only its length and what cannot be stored are looked at. */
const typedText = z
  .string()
  .max(2000, "At most 2000 characters.")
  .refine((text) => !unstorable.test(text), "A control character cannot be stored.");

const draftChange = z.strictObject({
  field: z.string().max(160).refine(isDraftField, "The sheet has no such field."),
  /** What stood there when it was changed. */
  base: typedText,
  value: typedText,
});

export const openCycleDraftInput = writeInput({ setId: id("set"), phase: choice("Phase", phases) });
export const getCycleDraftInput = z.object({ draftId: id("draft") });
export const getCycleDraftChangesInput = z.object({ draftId: id("draft"), version: baseVersion });
export const saveCycleDraftInput = z.strictObject({
  idempotencyKey,
  draftId: id("draft"),
  version: baseVersion,
  changes: z.array(draftChange).min(1).max(3000),
});
export const putAwayCycleDraftInput = writeInput({ draftId: id("draft"), reason: reason() });
export const recordCycleInput = writeInput({ draftId: id("draft"), version: baseVersion });
export const openCycleCorrectionInput = writeInput({ cycleId: id("cycle") });
export const recordCycleCorrectionInput = writeInput({
  draftId: id("draft"),
  version: baseVersion,
  reason: reason("Reason for the correction"),
});
export const sendToReviewInput = writeInput({ setId: id("set") });
export const getSetResultsInput = z.object({ setId: id("set") });
export const getReadingFileInput = z.object({ readingFileId: id("file") });

export const readingFileFormat = z.strictObject({
  separator: z.enum([",", ";"]),
  decimalMark: z.enum([".", ","]),
});
export type ReadingFileFormat = z.output<typeof readingFileFormat>;
