import "server-only";
import { asc, eq } from "drizzle-orm";
import { alias } from "drizzle-orm/pg-core";
import type { Connection } from "../../db/client";
import { certificates } from "../../db/schema/certificates";
import { people } from "../../db/schema/people";
import type { CertificateState } from "../../db/vocabulary";
import type { CertificateContent } from "../../documents/certificate/content";
import type { Context } from "../access/actor";
import { read } from "../read";
import { getCertificateInput } from "./inputs";
import { requireCertificate } from "./internal";

export type CertificateRevision = {
  certificateId: string;
  number: string;
  revision: number;
  state: CertificateState;
  issuedAt: Date;
  releasedBy: string;
  /** Why it took the place of the one before; null in the first. */
  replacementReason: string | null;
  /** When, by whom and why it left the current state. */
  stateAt: Date | null;
  stateBy: string | null;
  stateReason: string | null;
};

/** A certificate with what it says, and every revision of its series, oldest first. */
export function getCertificate(context: Context, raw: unknown) {
  return read(context, "getCertificate", getCertificateInput, raw, async ({ connection, input, grant }) => {
    const { id, content, ...stored } = await requireCertificate(connection, input.certificateId, grant);
    const revisions = await revisionsOf(connection, stored.series);
    return {
      ...revisions.find((revision) => revision.certificateId === id)!,
      content: content as CertificateContent,
      setId: stored.setId,
      setNumber: stored.setNumber,
      contentSha256: stored.contentSha256,
      pdfSha256: stored.pdfSha256,
      pdfBytes: stored.pdfBytes,
      verificationCode: stored.verificationCode,
      programVersion: stored.programVersion,
      revisions,
    };
  });
}

export type CertificateDetail = Awaited<ReturnType<typeof getCertificate>>;

async function revisionsOf(connection: Connection, series: string): Promise<CertificateRevision[]> {
  const releaser = alias(people, "releaser");
  const stateSetter = alias(people, "state_setter");
  return connection
    .select({
      certificateId: certificates.id,
      number: certificates.number,
      revision: certificates.revision,
      state: certificates.state,
      issuedAt: certificates.issuedAt,
      releasedBy: releaser.name,
      replacementReason: certificates.replacementReason,
      stateAt: certificates.stateAt,
      stateBy: stateSetter.name,
      stateReason: certificates.stateReason,
    })
    .from(certificates)
    .innerJoin(releaser, eq(releaser.id, certificates.releasedBy))
    .leftJoin(stateSetter, eq(stateSetter.id, certificates.stateBy))
    .where(eq(certificates.series, series))
    .orderBy(asc(certificates.revision));
}
