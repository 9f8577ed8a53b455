export type NavigationBadge = {
  count: number;
  /** What is counted, for those who do not see it: "2 calibrations overdue". */
  label: string;
  tone?: "out" | "held" | "plain";
};

export type NavigationItem = { href: string; label: string; badge?: NavigationBadge | null };

/** The entry whose address is the longest beginning of this path. */
export function currentHref(items: readonly NavigationItem[], path: string): string | null {
  const leading = items.filter(({ href }) => path === href || (href !== "/" && path.startsWith(`${href}/`)));
  return leading.reduce<string | null>(
    (best, { href }) => (href.length > (best?.length ?? 0) ? href : best),
    null,
  );
}
