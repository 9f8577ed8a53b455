/** What stood before and what stands after, as it is on record. */
export function Changes({ before, after }: { before: unknown; after: unknown }) {
  if (before === null && after === null) return null;
  return (
    <details>
      <summary className="text-small">Show</summary>
      {before === null ? null : <Value title="before" value={before} />}
      {after === null ? null : <Value title="after" value={after} />}
    </details>
  );
}

function Value({ title, value }: { title: string; value: unknown }) {
  return (
    <>
      <p className="text-key text-ink-2">{title}</p>
      <pre className="max-h-64 max-w-xl overflow-auto text-small whitespace-pre-wrap wrap-anywhere">
        {JSON.stringify(value, null, 1)}
      </pre>
    </>
  );
}
