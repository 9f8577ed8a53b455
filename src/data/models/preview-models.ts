import "server-only";
import type { Context } from "../access/actor";
import { read } from "../read";
import { mostProblems } from "../read-csv";
import { compareWithKnown } from "./compare-with-known";
import { previewModelsInput } from "./inputs";
import { readModelFile } from "./read-model-file";
import type { ModelImportPreview } from "./types";

/** What a file of models would bring, and line by line what is wrong with it. */
export function previewModels(context: Context, raw: unknown): Promise<ModelImportPreview> {
  return read(context, "previewModels", previewModelsInput, raw, async ({ connection, input }) => {
    const { lines, problems } = await readModelFile(input.csv);
    const compared = await compareWithKnown(connection, lines);
    const fresh = new Set(compared.fresh);
    return {
      lines: lines.map((line) => ({
        line: line.line,
        make: line.values.make,
        partNumber: line.values.partNumber,
        change: fresh.has(line) ? "new" : "known",
      })),
      problems: [...problems, ...compared.problems].slice(0, mostProblems),
    };
  });
}
