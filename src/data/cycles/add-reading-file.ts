import "server-only";
import { eq } from "drizzle-orm";
import { recordNow } from "../../db/columns";
import { blobs } from "../../db/schema/blobs";
import { cycleDrafts, readingFiles } from "../../db/schema/cycles";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { invalid } from "../access/errors";
import { fileLabel } from "../received-bytes";
import { write } from "../write";
import { lockOpenDraft, requireSameDraft } from "./lock-open-draft";
import { addReadingFileInput, changesOnSheet } from "./preview-reading-file";
import { mergeChanges } from "./sheet/merge-changes";

/** Puts a file's readings on the sheet, all or none, and keeps the bytes as they were sent. */
export function addReadingFile(context: Context, raw: unknown) {
  return write(
    context,
    "addReadingFile",
    addReadingFileInput,
    raw,
    async ({ transaction, input, record }) => {
      const draft = await lockOpenDraft(transaction, input.draftId);
      requireSameDraft(draft, input.version);
      const { bytes, sha256 } = input.file;
      const { changes, problems, rows } = await changesOnSheet(transaction, draft, bytes, input.format);
      const [first] = problems;
      if (first) throw invalid("file", `Line ${first.line}, ${first.column ?? "the line"}: ${first.message}`);
      const { personId } = requirePerson(context);
      await transaction
        .insert(blobs)
        .values({ sha256, mediaType: "text/csv", sizeBytes: bytes.length, bytes })
        .onConflictDoNothing();
      const [file] = await transaction
        .insert(readingFiles)
        .values({
          draftId: draft.id,
          sha256,
          name: fileLabel(input.name, "readings.csv"),
          rows,
          sentBy: personId,
        })
        .returning({ id: readingFiles.id });
      const { fields } = mergeChanges(draft.fields, changes);
      await transaction
        .update(cycleDrafts)
        .set({ fields, version: draft.version + 1, savedBy: personId, savedAt: recordNow })
        .where(eq(cycleDrafts.id, draft.id));
      await record({
        event: "reading file added",
        noun: "reading file",
        objectId: file!.id,
        setId: draft.setId,
        after: { sha256, rows, changed: changes.length },
      });
      return { readingFileId: file!.id, version: draft.version + 1 };
    },
  );
}
