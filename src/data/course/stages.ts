import type { Stage } from "../../db/vocabulary";

/** Stages in which a set is worked on; from certified on its record is frozen. */
export const openStages = [
  "checked in",
  "as found",
  "cleaning",
  "as left",
  "in review",
] as const satisfies Stage[];

export function isOpenStage(stage: Stage): boolean {
  return (openStages as readonly Stage[]).includes(stage);
}
