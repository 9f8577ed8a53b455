import "server-only";

/** The fields that an edit changes, before and after, for the activity record. */
export function changedFields<Values extends Record<string, unknown>>(
  stored: { [Field in keyof Values]: unknown },
  values: Values,
) {
  const fields = Object.keys(values).filter(
    (field) => JSON.stringify(stored[field]) !== JSON.stringify(values[field]),
  );
  const pick = (from: Record<string, unknown>) =>
    Object.fromEntries(fields.map((field) => [field, from[field]]));
  return { before: pick(stored), after: pick(values) };
}
