import "server-only";
import { type CsvProblem, type CsvRow, decodeCsv, mostProblems, readCsv } from "../read-csv";
import { type ModelValues, modelColumnNames, modelValues } from "./inputs";

export type ModelLine = { line: number; values: ModelValues };
const mostModels = 2000;
type Fields = (keyof ModelValues)[];

const fieldOf = new Map(
  (Object.keys(modelColumnNames) as Fields).map((field) => [modelColumnNames[field], field] as const),
);

/** The models that a file lists, and whatever is wrong with it; with a problem nothing is taken over. */
export async function readModelFile(csv: string): Promise<{ lines: ModelLine[]; problems: CsvProblem[] }> {
  const decoded = decodeCsv(Buffer.from(csv));
  if ("problem" in decoded) return { lines: [], problems: [problem(1, null, decoded.problem)] };
  if (decoded.text.includes("\uFFFD"))
    return { lines: [], problems: [problem(1, null, "The file is not UTF-8. Please save it as UTF-8.")] };
  const found = new ModelLines();
  const broken = await readCsv(decoded.text, separatorOf(decoded.text), (row) => found.take(row));
  const problems = broken ? [...found.problems, broken] : found.problems;
  if (problems.length === 0 && found.lines.length === 0)
    problems.push(problem(1, null, "The file lists no models below its header."));
  return { lines: found.lines, problems: problems.slice(0, mostProblems) };
}

class ModelLines {
  readonly lines: ModelLine[] = [];
  readonly problems: CsvProblem[] = [];
  private fields: Fields | null = null;
  private readonly lineOfName = new Map<string, number>();

  /** False once nothing more can be learnt from the file. */
  take(row: CsvRow): boolean {
    if (this.fields) this.takeModel(row, this.fields);
    else {
      const header = readHeader(row);
      if ("problems" in header) this.problems.push(...header.problems);
      else this.fields = header.fields;
    }
    return this.fields !== null && this.problems.length < mostProblems;
  }

  private takeModel({ line, cells }: CsvRow, fields: Fields): void {
    if (cells.length !== fields.length) {
      this.problems.push(
        problem(line, null, `${cells.length} cells, but the header names ${fields.length} columns.`),
      );
      return;
    }
    const parsed = modelValues.safeParse(Object.fromEntries(fields.map((field, at) => [field, cells[at]])));
    if (!parsed.success) {
      for (const { path, message } of parsed.error.issues)
        this.problems.push(problem(line, modelColumnNames[path[0] as keyof ModelValues] ?? null, message));
      return;
    }
    const name = `${parsed.data.make} ${parsed.data.partNumber}`.toLowerCase();
    const first = this.lineOfName.get(name);
    if (first) this.problems.push(problem(line, "part_number", `Line ${first} lists the same model.`));
    if (this.lines.length === mostModels)
      this.problems.push(problem(line, null, `A file lists at most ${mostModels} models. Please split it.`));
    this.lineOfName.set(name, line);
    this.lines.push({ line, values: parsed.data });
  }
}

function readHeader({ line, cells }: CsvRow): { fields: Fields } | { problems: CsvProblem[] } {
  const names = cells.map((cell) => cell.replace("\uFEFF", "").trim().toLowerCase());
  const problems = names.flatMap((name, at) => {
    if (!fieldOf.has(name))
      return [problem(line, name || `column ${at + 1}`, "The header has no such column.")];
    return names.indexOf(name) === at ? [] : [problem(line, name, "The header names this column twice.")];
  });
  for (const name of fieldOf.keys())
    if (!names.includes(name)) problems.push(problem(line, name, "The header lacks this column."));
  return problems.length > 0 ? { problems } : { fields: names.map((name) => fieldOf.get(name)!) };
}

/** Whichever of the two the header has more of. */
function separatorOf(text: string): "," | ";" {
  const header = text.slice(0, text.search(/[\r\n]|$/));
  return header.split(";").length > header.split(",").length ? ";" : ",";
}

function problem(line: number, column: string | null, message: string): CsvProblem {
  return { line, column, message };
}
