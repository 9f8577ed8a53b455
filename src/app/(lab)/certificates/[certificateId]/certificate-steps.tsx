import type { Context } from "@/data/access/actor";
import { type CertificateDetail, recordersOf, releaseMeaning, seenRecords } from "@/data/certificates";
import { getSetResults } from "@/data/cycles";
import { answerPage } from "@/data/edge/answer-page";
import { getLabDetails } from "@/data/lab";
import { getSet } from "@/data/sets";
import { ReissueDialog } from "@/features/certificates/reissue-dialog";
import { RevokeDialog } from "@/features/certificates/revoke-dialog";
import { obstacleFor, signingOf } from "@/features/certificates/signing-of";

type Props = { context: Context; certificate: CertificateDetail };

/** What the manager may do with the newest of its series. Somebody who recorded part of it does not reissue it. */
export async function CertificateSteps({ context, certificate }: Props) {
  const { setId, content, state, revision, revisions } = certificate;
  const set = await answerPage(getSet(context, { setId }));
  const results = await answerPage(getSetResults(context, { setId }));
  const lab = await answerPage(getLabDetails(context));
  if (context.actor.kind !== "person" || revisions.at(-1)?.revision !== revision) return null;
  const recorded = recordersOf(results);
  const obstacle = obstacleFor(context.actor, recorded, lab.releaserIsAnother);
  return (
    <>
      {state === "current" ? <RevokeDialog certificate={certificate} /> : null}
      {obstacle ? null : (
        <ReissueDialog
          certificate={{ ...certificate, remarks: content.remarks }}
          version={set.version}
          seen={seenRecords(results)}
          paperSize={content.paperSize}
          signing={signingOf({
            person: context.actor,
            recorded,
            verdict: results.asLeft?.verdict.verdict ?? null,
            meaning: releaseMeaning,
          })}
        />
      )}
    </>
  );
}
