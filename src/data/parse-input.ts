import "server-only";
import type { z } from "zod";
import { Refusal } from "./access/errors";

/** Field names as forms write them: `injectors[2].serial`. */
function fieldName(path: PropertyKey[]): string {
  return path
    .map((part, index) => (typeof part === "number" ? `[${part}]` : `${index ? "." : ""}${String(part)}`))
    .join("");
}

export function parseInput<Schema extends z.ZodType>(schema: Schema, raw: unknown): z.output<Schema> {
  const parsed = schema.safeParse(raw);
  if (parsed.success) return parsed.data;
  const fields: Record<string, string[]> = {};
  for (const issue of parsed.error.issues) {
    const name = fieldName(issue.path);
    fields[name] = [...(fields[name] ?? []), issue.message];
  }
  throw new Refusal("invalid", "Please look at the marked fields.", { fields });
}
