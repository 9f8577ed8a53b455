import "server-only";

export { correctCleaningRun } from "./correct-cleaning-run";
export { loadCleaningRuns } from "./load-cleaning-runs";
export { recordCleaningRun } from "./record-cleaning-run";
