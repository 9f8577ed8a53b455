import "server-only";
import { and, desc, eq } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { certificates } from "../../db/schema/certificates";
import type { Context } from "../access/actor";
import { refused } from "../access/errors";
import { write } from "../write";
import { reissueCertificateInput } from "./inputs";
import { requireCertificateForUpdate } from "./internal";
import { issueCertificate } from "./issue-certificate";
import { requireAsSeen } from "./require-as-seen";
import { requireReleaser } from "./require-releaser";

/** A new revision that names the one before. A current one becomes superseded by it; a revoked one stays revoked. */
export function reissueCertificate(context: Context, raw: unknown) {
  return write(
    context,
    "reissueCertificate",
    reissueCertificateInput,
    raw,
    async ({ transaction, input, record }) => {
      const { certificateId, paperSize, remarks, reason } = input;
      const before = await requireCertificateForUpdate(transaction, certificateId);
      await requireNewest(transaction, before);
      const { setId, series } = before;
      const reviewed = await requireAsSeen(transaction, context, {
        ...input,
        setId,
        stages: ["certified", "handed over"],
      });
      const releaser = await requireReleaser(transaction, context, reviewed);
      const revision = before.revision + 1;
      const number = `${series}/${revision}`;
      if (before.state === "current")
        await transaction
          .update(certificates)
          .set({
            state: "superseded",
            stateBy: releaser.personId,
            stateReason: `Replaced by ${number}: ${reason}`,
          })
          .where(eq(certificates.id, certificateId));
      const issued = await issueCertificate(
        transaction,
        reviewed,
        { number, revision, replaces: { number: before.number, reason }, paperSize, remarks, releaser },
        { series, replacesId: certificateId },
      );
      await record({
        event: "certificate reissued",
        noun: "certificate",
        objectId: issued.certificateId,
        setId,
        before: { certificateId, number: before.number, state: before.state },
        after: { number, pdfSha256: issued.pdfSha256 },
        reason,
      });
      return { certificateId: issued.certificateId, number, setId };
    },
  );
}

async function requireNewest(
  transaction: Transaction,
  { id, series }: { id: string; series: string },
): Promise<void> {
  const [newest] = await transaction
    .select({ id: certificates.id, number: certificates.number })
    .from(certificates)
    .where(and(eq(certificates.series, series)))
    .orderBy(desc(certificates.revision))
    .limit(1);
  if (newest && newest.id !== id) throw refused(`${newest.number} has already taken its place.`);
}
