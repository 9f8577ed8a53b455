import type { CertificateRevision } from "@/data/certificates";
import { formatRecordInstant } from "@/format/format-date";
import { Notice } from "@/ui/feedback/notice";

type Props = { certificate: CertificateRevision; revisions: CertificateRevision[]; zone: string };

/** Says at once that a certificate is not in force any more, since when and why. */
export function CertificateNotice({ certificate, revisions, zone }: Props) {
  const { number, state, stateAt, stateReason } = certificate;
  if (state === "current") return null;
  const newest = revisions.find((revision) => revision.state === "current");
  const title = state === "revoked" ? `${number} is revoked` : `${number} is superseded`;
  return (
    <Notice kind={state === "revoked" ? "refusal" : "caution"} title={title}>
      <p>
        Since {formatRecordInstant(stateAt, zone)}. {stateReason}
      </p>
      <p>{newest ? `In force now: ${newest.number}.` : "No revision of it is in force."}</p>
    </Notice>
  );
}
