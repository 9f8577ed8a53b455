import "server-only";

export { addReadingFile } from "./add-reading-file";
export { type CycleDraft, getCycleDraft } from "./get-cycle-draft";
export { getCycleDraftChanges } from "./get-cycle-draft-changes";
export { getReadingFile } from "./get-reading-file";
export { getSetResults } from "./get-set-results";
export { listBenchQueue } from "./list-bench-queue";
export { openCycleCorrection } from "./open-cycle-correction";
export { openCycleDraft } from "./open-cycle-draft";
export { previewReadingFile } from "./preview-reading-file";
export { putAwayCycleDraft } from "./put-away-cycle-draft";
export { railStripsOfSets } from "./rail-strips-of-sets";
export { recordCycle } from "./record-cycle";
export { recordCycleCorrection } from "./record-cycle-correction";
export { saveCycleDraft } from "./save-cycle-draft";
export { sendToReview } from "./send-to-review";
