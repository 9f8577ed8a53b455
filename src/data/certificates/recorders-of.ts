import type { CycleRevision, Recorder, SetResults } from "../cycles/results";

export type RecordedPart = { recorder: Recorder; parts: string[] };

/** Who recorded what of a set's results, corrections and repeated cycles included. */
export function recordersOf(results: SetResults): RecordedPart[] {
  const byPerson = new Map<string, RecordedPart>();
  const add = (recorder: Recorder, part: string) => {
    const entry = byPerson.get(recorder.personId) ?? { recorder, parts: [] };
    if (!entry.parts.includes(part)) entry.parts.push(part);
    byPerson.set(recorder.personId, entry);
  };
  const addRevisions = (part: string, revisions: CycleRevision[]) => {
    for (const revision of revisions)
      add(revision.recordedBy, revision.revision === 1 ? part : `${part}, corrected`);
  };
  for (const cycle of results.repeatedCycles)
    addRevisions(`${cycle.phase}, cycle ${cycle.number}`, cycle.revisions.toReversed());
  for (const phase of [results.asFound, results.asLeft])
    if (phase) addRevisions(phase.phase, [...phase.earlierRevisions.toReversed(), phase.latest]);
  for (const run of results.cleaningRuns)
    for (const entry of [...run.corrects, run]) add(entry.recordedBy, "cleaning");
  return [...byPerson.values()];
}
