import "server-only";
import { asc, eq } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { blobs } from "../../db/schema/blobs";
import { cycleDrafts, readingFiles } from "../../db/schema/cycles";
import { people } from "../../db/schema/people";

/** The files of readings that were sent for a set's sheets, oldest first. */
export function loadReadingFiles(connection: Connection, setId: string) {
  return connection
    .select({
      readingFileId: readingFiles.id,
      draftId: readingFiles.draftId,
      name: readingFiles.name,
      rows: readingFiles.rows,
      sizeBytes: blobs.sizeBytes,
      sha256: readingFiles.sha256,
      sentBy: people.name,
      sentAt: readingFiles.sentAt,
    })
    .from(readingFiles)
    .innerJoin(cycleDrafts, eq(cycleDrafts.id, readingFiles.draftId))
    .innerJoin(blobs, eq(blobs.sha256, readingFiles.sha256))
    .innerJoin(people, eq(people.id, readingFiles.sentBy))
    .where(eq(cycleDrafts.setId, setId))
    .orderBy(asc(readingFiles.sentAt));
}
