import type { SetResults } from "../cycles/results";

/** Names every record that a set's results rest on. A form carries it back, so that what was not seen is not approved. */
export function seenRecords(results: SetResults): string {
  return Object.entries(recordsOf(results))
    .map(([what, ids]) => `${what}=${ids.join("+")}`)
    .join("&");
}

type Kind = "found" | "left" | "class" | "cleaning";

function recordsOf(results: SetResults): Record<Kind, string[]> {
  return {
    found: results.asFound ? [results.asFound.latest.cycleRevisionId] : [],
    left: results.asLeft ? [results.asLeft.latest.cycleRevisionId] : [],
    class: [results.toleranceClass.toleranceClassRevisionId],
    cleaning: results.cleaningRuns.map((run) => run.cleaningRunId),
  };
}

const sentences: Record<Kind, string> = {
  found: "The as-found cycle has a newer revision than the one shown.",
  left: "The as-left cycle has a newer revision than the one shown.",
  class: "The tolerance class was revised or changed.",
  cleaning: "A cleaning run was recorded or corrected.",
};

/** What changed since the form was made, as sentences. */
export function changesSince(seen: string, results: SetResults): string[] {
  const before = new URLSearchParams(seen.replaceAll("+", "%2B"));
  return Object.entries(recordsOf(results))
    .filter(([what, ids]) => before.get(what) !== ids.join("+"))
    .map(([what]) => sentences[what as Kind]);
}
