import "server-only";
import { groupBy } from "../group-by";
import type { LoadedRevision } from "./load-revisions";
import type { EarlierCycle } from "./results";

/** Cycles that a later one of the same phase has taken the place of, oldest first. */
export function repeatedCyclesOf(revisions: LoadedRevision[]): EarlierCycle[] {
  const byCycle = groupBy(revisions, (revision) => revision.cycle.cycleId);
  const cycles = [...byCycle.values()].map((ofCycle) => ({
    ...ofCycle[0]!.cycle,
    revisions: ofCycle.map(withoutCycle).reverse(),
  }));
  return cycles
    .filter((cycle) => cycles.some((other) => other.phase === cycle.phase && other.number > cycle.number))
    .map(({ setId: _set, ...cycle }) => cycle);
}

export function withoutCycle({ cycle: _cycle, ...revision }: LoadedRevision) {
  return revision;
}
