import "server-only";
import { eq } from "drizzle-orm";
import { blobs } from "../../db/schema/blobs";
import type { Context } from "../access/actor";
import { read } from "../read";
import { getCertificateInput } from "./inputs";
import { requireCertificate } from "./internal";

/** The bytes that were stored at issue, unchanged ever since. */
export function getCertificateFile(context: Context, raw: unknown) {
  return read(
    context,
    "getCertificateFile",
    getCertificateInput,
    raw,
    async ({ connection, input, grant }) => {
      const { number, state, pdfSha256 } = await requireCertificate(connection, input.certificateId, grant);
      const [blob] = await connection.select().from(blobs).where(eq(blobs.sha256, pdfSha256));
      return { number, state, sha256: pdfSha256, mediaType: blob!.mediaType, bytes: blob!.bytes };
    },
  );
}
