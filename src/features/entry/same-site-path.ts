const anyOrigin = "http://here.invalid";

/** Where a redirect may lead: a path of our own, or the start page. One URL parse decides. */
export function sameSitePath(wanted: string | undefined): string {
  if (!wanted?.startsWith("/")) return "/";
  try {
    const parsed = new URL(wanted, anyOrigin);
    const own = parsed.origin === anyOrigin && !parsed.pathname.startsWith("//");
    return own ? `${parsed.pathname}${parsed.search}` : "/";
  } catch {
    return "/";
  }
}
