import "server-only";
import type { Phase, Stage } from "../../db/vocabulary";
import { refused } from "../access/errors";

const stagesOf: Record<Phase, readonly Stage[]> = {
  "as found": ["checked in", "as found"],
  "as left": ["cleaning", "as left"],
};

/** A set is measured as found before it is cleaned, and as left after it. */
export function requireTurn(stage: Stage, phase: Phase): void {
  if (stagesOf[phase].includes(stage)) return;
  const missing = phase === "as left" && stage === "as found" ? ["A cleaning run is recorded first."] : [];
  throw refused(`A set that is ${stage} takes no cycle ${phase}.`, missing);
}
