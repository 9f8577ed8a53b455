import type { Context } from "@/data/access/actor";
import { recordersOf, releaseMeaning, seenRecords } from "@/data/certificates";
import type { SetResults } from "@/data/cycles/results";
import type { LabDetails } from "@/data/lab";
import type { SetDetail } from "@/data/sets";
import { ReviewPanel } from "@/features/certificates/review-panel";
import { obstacleFor, signingOf } from "@/features/certificates/signing-of";

type Props = { context: Context; set: SetDetail; results: SetResults; lab: LabDetails };

/** The manager's decision, with what it will rest on. */
export function SetReview({ context: { actor }, set, results, lab }: Props) {
  if (actor.kind !== "person") return null;
  const recorded = recordersOf(results);
  return (
    <ReviewPanel
      set={set}
      seen={seenRecords(results)}
      paperSize={lab.paperSize}
      signing={signingOf({
        person: actor,
        recorded,
        verdict: results.asLeft?.verdict.verdict ?? null,
        meaning: releaseMeaning,
      })}
      obstacle={obstacleFor(actor, recorded, lab.releaserIsAnother)}
    />
  );
}
