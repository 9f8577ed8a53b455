import "server-only";
import { inArray } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { injectorModels } from "../../db/schema/models";
import type { CsvProblem } from "../read-csv";
import { modelChanges } from "./changes";
import { modelColumnNames } from "./inputs";
import { modelName } from "./internal";
import type { ModelLine } from "./read-model-file";

/** Which lines are new. A known model is never overwritten by a file: other values than those on record are a problem. */
export async function compareWithKnown(connection: Connection, lines: ModelLine[]) {
  const known = await knownModels(connection, lines);
  const problems: CsvProblem[] = [];
  const fresh: ModelLine[] = [];
  for (const line of lines) {
    const stored = known.get(nameOf(line));
    const differing = stored ? Object.keys(modelChanges(stored, line.values).after) : [];
    if (!stored) fresh.push(line);
    for (const field of differing.filter((name) => name !== "make" && name !== "partNumber"))
      problems.push({
        line: line.line,
        column: modelColumnNames[field as keyof typeof modelColumnNames],
        message: `The model is on record with ${stored?.[field as keyof typeof modelColumnNames]}. Change it on its own page.`,
      });
  }
  return { fresh, problems };
}

export function nameOf({ values }: ModelLine): string {
  return `${values.make} ${values.partNumber}`.toLowerCase();
}

async function knownModels(connection: Connection, lines: ModelLine[]) {
  if (lines.length === 0) return new Map<string, typeof injectorModels.$inferSelect>();
  const rows = await connection
    .select()
    .from(injectorModels)
    .where(inArray(modelName, lines.map(nameOf)));
  return new Map(rows.map((row) => [`${row.make} ${row.partNumber}`.toLowerCase(), row]));
}
