import "server-only";
import { createHash } from "node:crypto";
import program from "../../../package.json" with { type: "json" };
import type { Transaction } from "../../db/client";
import { blobs } from "../../db/schema/blobs";
import { certificates } from "../../db/schema/certificates";
import type { CertificateContent } from "../../documents/certificate/content";
import { fingerprintContent } from "../../documents/certificate/fingerprint";
import { renderCertificate } from "../../documents/certificate/render-certificate";
import { MissingGlyphError } from "../../documents/drawing/missing-glyph-error";
import { refused } from "../access/errors";
import { buildContent, type Issue } from "./content/build-content";
import { type CertificateBasis, loadBasis } from "./load-basis";
import { lockCalibrations } from "./lock-calibrations";
import type { Reviewed } from "./require-as-seen";
import { makeVerificationCode } from "./verification-code";

type Wanted = Omit<Issue, "verificationCode" | "programVersion">;
type Stored = { series: string; replacesId: string | null };

/**
 * Builds, draws and stores a certificate. Drawing takes well under a second and stays inside the transaction: only then are
 * the stored bytes those of the stored content, with a number that no refusal can have used up.
 */
export async function issueCertificate(
  transaction: Transaction,
  reviewed: Reviewed,
  wanted: Wanted,
  { series, replacesId }: Stored,
) {
  const { set, results } = reviewed;
  await lockCalibrations(transaction, [
    ...results.asFound.latest.calibrations,
    ...results.asLeft.latest.calibrations,
  ]);
  const basis = await loadBasis(transaction, { setId: set.setId, customerId: set.customer.customerId });
  const issue = { ...wanted, verificationCode: makeVerificationCode(), programVersion: program.version };
  const content = buildContent(reviewed, basis, issue);
  const bytes = await draw(content, basis);
  const pdfSha256 = sha256(bytes);
  await transaction
    .insert(blobs)
    .values({ sha256: pdfSha256, mediaType: "application/pdf", sizeBytes: bytes.length, bytes });
  const [stored] = await transaction
    .insert(certificates)
    .values({
      number: issue.number,
      series,
      revision: issue.revision,
      setId: set.setId,
      replacesId,
      replacementReason: issue.replaces?.reason ?? null,
      asFoundRevisionId: results.asFound.latest.cycleRevisionId,
      asLeftRevisionId: results.asLeft.latest.cycleRevisionId,
      toleranceClassRevisionId: results.toleranceClass.toleranceClassRevisionId,
      content,
      contentSha256: fingerprintContent(content),
      pdfSha256,
      verificationCode: issue.verificationCode,
      programVersion: program.version,
      releasedBy: issue.releaser.personId,
    })
    .returning({ certificateId: certificates.id });
  return { certificateId: stored!.certificateId, number: issue.number, pdfSha256 };
}

async function draw(content: CertificateContent, { sprayPhotos }: CertificateBasis): Promise<Uint8Array> {
  try {
    return await renderCertificate(content, new Map(sprayPhotos.map(({ sha256, bytes }) => [sha256, bytes])));
  } catch (error) {
    if (error instanceof MissingGlyphError)
      throw refused("The certificate holds a sign that cannot be printed.", [error.message]);
    throw error;
  }
}

function sha256(data: Uint8Array): string {
  return createHash("sha256").update(data).digest("hex");
}
