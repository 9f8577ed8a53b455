import "server-only";
import { conflict } from "./access/errors";

type Versioned = { version: number } & Record<string, unknown>;

/** A stale edit is refused with both values of every field that differs. */
export function requireSameVersion<Values extends Record<string, unknown>>({
  stored,
  version,
  values,
  labels,
}: {
  stored: Versioned;
  version: number;
  values: Values;
  labels: { [Field in keyof Values]?: string };
}): void {
  if (stored.version === version) return;
  const differing = Object.keys(values).filter((field) => asText(stored[field]) !== asText(values[field]));
  throw conflict("Somebody else changed this while you were typing.", [
    ...differing.map((field) => ({
      field,
      label: labels[field] ?? field,
      theirs: asText(stored[field]),
      yours: asText(values[field]),
    })),
    // With it the form can go on from what is saved now.
    { field: "version", label: "Version", theirs: asText(stored.version), yours: asText(version) },
  ]);
}

function asText(value: unknown): string {
  if (value === null || value === undefined) return "";
  return Array.isArray(value) ? value.join(", ") : String(value);
}
