import { formatRecordDayOf } from "../../../format/format-date";
import { plural } from "../../../format/plural";
import type { PhaseResults } from "../../cycles/results";
import type { Reviewed } from "../require-as-seen";

/** What a reader must know beside the figures: corrections, repeated cycles, readings kept though in doubt, rejections. */
export function describeDeviations({ set, results }: Reviewed, timeZone: string): string[] {
  const phases = [results.asFound, results.asLeft];
  const day = (instant: Date) => formatRecordDayOf(instant, timeZone);
  return [
    ...results.repeatedCycles.map(
      (cycle) =>
        `Cycle ${cycle.number} ${cycle.phase}, measured on ${day(cycle.measuredAt)}, was followed by a later one, which is the one reported.`,
    ),
    ...phases.flatMap((phase) => corrections(phase, day)),
    ...phases.flatMap(notAtReferencePressure),
    ...phases.flatMap(keptAsRead),
    ...set.injectors.flatMap(({ tag, rejection }) =>
      rejection ? [`${tag} was rejected on ${day(rejection.at)}: ${rejection.reason}`] : [],
    ),
    ...set.injectors.flatMap(({ tag, replacesTag }) =>
      replacesTag ? [`${tag} took the place of ${replacesTag}.`] : [],
    ),
  ];
}

function corrections(
  { phase, latest, earlierRevisions }: PhaseResults,
  day: (instant: Date) => string,
): string[] {
  return [...earlierRevisions.toReversed(), latest].flatMap(({ revision, reason, recordedAt }) =>
    reason
      ? [`The record ${phase} was corrected on ${day(recordedAt)} (revision ${revision}): ${reason}`]
      : [],
  );
}

function notAtReferencePressure({ phase, figures }: PhaseResults): string[] {
  return figures.correction.dynamicWithinRange
    ? []
    : [
        `Flows per pulse ${phase} stand at the pressure they were measured at: it is too far from the reference pressure to be brought to it.`,
      ];
}

function keptAsRead({ phase, latest, findings }: PhaseResults): string[] {
  const unacknowledged = findings.filter((finding) => !finding.acknowledged).length;
  const kept = latest.acknowledged.map(({ sentence }) => `Recorded as read ${phase}: ${sentence}`);
  return unacknowledged === 0
    ? kept
    : [
        ...kept,
        `${plural(unacknowledged, "further reading")} ${phase} stood out and ${unacknowledged === 1 ? "was" : "were"} looked at in review.`,
      ];
}
