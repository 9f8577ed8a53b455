/**
 * One key per filled form, so that the same form sent twice is one write. The server's rendering and the browser's make
 * different keys; either will do.
 */
export function IdempotencyKey({ value, name = "idempotencyKey" }: { value: string; name?: string }) {
  return <input type="hidden" name={name} value={value} readOnly suppressHydrationWarning />;
}
