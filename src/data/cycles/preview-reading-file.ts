import "server-only";
import { eq } from "drizzle-orm";
import { z } from "zod";
import type { Connection } from "../../db/client";
import { cycleDrafts } from "../../db/schema/cycles";
import type { Context } from "../access/actor";
import { notFound } from "../access/errors";
import { baseVersion, id, writeInput } from "../fields";
import { read } from "../read";
import { mostProblems } from "../read-csv";
import { receivedBytes } from "../received-bytes";
import { injectorsOfDraft } from "./injectors-of-draft";
import { type ReadingFileFormat, readingFileFormat } from "./inputs";
import { loadBenches } from "./load-benches";
import type { OpenDraft } from "./lock-open-draft";
import { readReadingFile } from "./read-reading-file";
import { changesOfFile } from "./sheet/changes-of-file";

const fileFields = {
  draftId: id("draft"),
  name: z.string().max(2000),
  format: readingFileFormat,
  file: receivedBytes("Please choose a file of readings."),
};
const previewReadingFileInput = z.object(fileFields);
/** `version` is the draft's as the preview showed it. */
export const addReadingFileInput = writeInput({ ...fileFields, version: baseVersion });

/** What a file would put on the sheet, or line and column of what is wrong with it. Nothing is changed or kept. */
export function previewReadingFile(context: Context, raw: unknown) {
  return read(context, "previewReadingFile", previewReadingFileInput, raw, async ({ connection, input }) => {
    const [draft] = await connection.select().from(cycleDrafts).where(eq(cycleDrafts.id, input.draftId));
    if (!draft) throw notFound("draft");
    const { changes, problems, rows } = await changesOnSheet(
      connection,
      draft,
      input.file.bytes,
      input.format,
    );
    return { version: draft.version, rows, problems, changes };
  });
}

export async function changesOnSheet(
  connection: Connection,
  draft: OpenDraft,
  bytes: Uint8Array,
  format: ReadingFileFormat,
) {
  const read = await readReadingFile(bytes, format);
  if (read.problems.length > 0) return { changes: [], problems: read.problems, rows: read.rows };
  const benchId = draft.fields.benchId;
  const [bench] = benchId ? await loadBenches(connection, { benchId }) : [];
  if (!bench)
    return {
      changes: [],
      problems: [{ line: 1, column: null, message: "Please choose a bench first." }],
      rows: 0,
    };
  const injectors = await injectorsOfDraft(connection, draft);
  const { changes, problems } = changesOfFile(read.readings, {
    fields: draft.fields,
    injectors,
    collects: bench.collects,
  });
  return { changes, problems: problems.slice(0, mostProblems), rows: read.rows };
}
