import type { ModelValues } from "./inputs";

/** The fields that differ, before and after, for the activity record. */
export function modelChanges(stored: ModelValues, values: ModelValues) {
  const fields = (Object.keys(values) as (keyof ModelValues)[]).filter(
    (field) => stored[field] !== values[field],
  );
  const pick = (from: ModelValues) => Object.fromEntries(fields.map((field) => [field, from[field]]));
  return { before: pick(stored), after: pick(values) };
}
