import "server-only";
import { recordNow } from "../../db/columns";
import { brokenConstraint } from "../../db/lost-connection";
import { injectorModels } from "../../db/schema/models";
import type { Context } from "../access/actor";
import { Refusal, refused } from "../access/errors";
import { type CsvProblem, mostProblems } from "../read-csv";
import { write } from "../write";
import { compareWithKnown } from "./compare-with-known";
import { importModelsInput } from "./inputs";
import { readModelFile } from "./read-model-file";

/** All of a file's models or none. Those already on record with the same values are left as they are. */
export function importModels(context: Context, raw: unknown) {
  return write(context, "importModels", importModelsInput, raw, async ({ transaction, input, record }) => {
    const { lines, problems } = await readModelFile(input.csv);
    const compared = await compareWithKnown(transaction, lines);
    refuseProblems([...problems, ...compared.problems]);
    const added = compared.fresh.map(({ values }) => ({ ...values, confirmedAt: recordNow }));
    if (added.length > 0)
      await transaction
        .insert(injectorModels)
        .values(added)
        .catch((error: unknown) => {
          if (!brokenConstraint(error)) throw error;
          throw refused("Somebody added one of these models just now. Please look at the preview again.");
        });
    await record({
      event: "models imported",
      noun: "model",
      after: { added: added.length, known: lines.length - added.length },
    });
    return { added: added.length, known: lines.length - added.length };
  });
}

function refuseProblems(problems: CsvProblem[]): void {
  if (problems.length === 0) return;
  const messages = problems
    .slice(0, mostProblems)
    .map(({ line, column, message }) => `Line ${line}${column ? `, ${column}` : ""}: ${message}`);
  throw new Refusal("invalid", "Nothing was taken over. Please look at the file.", {
    fields: { csv: messages },
  });
}
