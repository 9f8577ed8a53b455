import "server-only";
import type { LoadedRevision } from "./load-revisions";
import type { EarlierCycle } from "./results";

/** Cycles that a later one of the same phase has taken the place of, oldest first. */
export function repeatedCyclesOf(revisions: LoadedRevision[]): EarlierCycle[] {
  const byCycle = new Map<string, LoadedRevision[]>();
  for (const revision of revisions)
    byCycle.set(revision.cycle.cycleId, [...(byCycle.get(revision.cycle.cycleId) ?? []), revision]);
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
