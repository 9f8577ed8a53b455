import "server-only";
import { eq } from "drizzle-orm";
import { certificates } from "../../db/schema/certificates";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { refused } from "../access/errors";
import { write } from "../write";
import { revokeCertificateInput } from "./inputs";
import { requireCertificateForUpdate } from "./internal";

/** Takes a certificate out of force. Its set stays certified but is not handed over before a new revision is issued. */
export function revokeCertificate(context: Context, raw: unknown) {
  return write(
    context,
    "revokeCertificate",
    revokeCertificateInput,
    raw,
    async ({ transaction, input, record }) => {
      const { personId } = requirePerson(context);
      const { id, setId, number, state } = await requireCertificateForUpdate(
        transaction,
        input.certificateId,
      );
      if (state !== "current") throw refused(`${number} is already ${state}.`);
      await transaction
        .update(certificates)
        .set({ state: "revoked", stateBy: personId, stateReason: input.reason })
        .where(eq(certificates.id, id));
      await record({
        event: "certificate revoked",
        noun: "certificate",
        objectId: id,
        setId,
        before: { state },
        after: { number, state: "revoked" },
        reason: input.reason,
      });
      return { certificateId: id, setId, number };
    },
  );
}
