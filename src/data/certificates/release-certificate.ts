import "server-only";
import { setReviews } from "../../db/schema/certificates";
import type { Context } from "../access/actor";
import { moveStage } from "../course";
import { takeNumber } from "../take-number";
import { write } from "../write";
import { releaseCertificateInput } from "./inputs";
import { issueCertificate } from "./issue-certificate";
import { requireAsSeen } from "./require-as-seen";
import { requireReleaser } from "./require-releaser";

/** The manager's approval and the certificate that follows from it, in one step. */
export function releaseCertificate(context: Context, raw: unknown) {
  return write(
    context,
    "releaseCertificate",
    releaseCertificateInput,
    raw,
    async ({ transaction, input, record }) => {
      const { setId, paperSize, remarks } = input;
      const reviewed = await requireAsSeen(transaction, context, { ...input, stages: ["in review"] });
      const releaser = await requireReleaser(transaction, context, reviewed);
      const { asFound, asLeft } = reviewed.results;
      await transaction.insert(setReviews).values({
        setId,
        decision: "approved",
        asFoundRevisionId: asFound.latest.cycleRevisionId,
        asLeftRevisionId: asLeft.latest.cycleRevisionId,
        reviewedBy: releaser.personId,
      });
      const series = `C${await takeNumber(transaction, "certificate")}`;
      const issued = await issueCertificate(
        transaction,
        reviewed,
        { number: `${series}/1`, revision: 1, replaces: null, paperSize, remarks, releaser },
        { series, replacesId: null },
      );
      await moveStage(transaction, context, reviewed.set, "certified");
      await record({
        event: "certificate released",
        noun: "certificate",
        objectId: issued.certificateId,
        setId,
        before: { stage: "in review" },
        after: { stage: "certified", number: issued.number, pdfSha256: issued.pdfSha256 },
      });
      return { certificateId: issued.certificateId, number: issued.number, setId };
    },
  );
}
