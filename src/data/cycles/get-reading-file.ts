import "server-only";
import { eq } from "drizzle-orm";
import { blobs } from "../../db/schema/blobs";
import { readingFiles } from "../../db/schema/cycles";
import type { Context } from "../access/actor";
import { notFound } from "../access/errors";
import { read } from "../read";
import { getReadingFileInput } from "./inputs";

/** The bytes as they were sent. */
export function getReadingFile(context: Context, raw: unknown) {
  return read(context, "getReadingFile", getReadingFileInput, raw, async ({ connection, input }) => {
    const [file] = await connection
      .select({ name: readingFiles.name, sha256: blobs.sha256, bytes: blobs.bytes })
      .from(readingFiles)
      .innerJoin(blobs, eq(blobs.sha256, readingFiles.sha256))
      .where(eq(readingFiles.id, input.readingFileId));
    if (!file) throw notFound("file");
    return file;
  });
}
