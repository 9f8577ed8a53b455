export const rowsPerPage = 50;

type Asked = Record<string, string | string[] | undefined>;

/** The page and the search that an address asks for; what it says wrongly is left out. */
export function readListPage({ page, search }: Asked) {
  const wanted = typeof page === "string" ? Math.floor(Number(page)) : 1;
  const number = Number.isFinite(wanted) ? Math.max(1, Math.min(10_000, wanted)) : 1;
  const startRow = (number - 1) * rowsPerPage;
  const text = typeof search === "string" ? search.slice(0, 160) : "";
  return { number, startRow, endRow: startRow + rowsPerPage, search: text };
}

type Listed = { path: string; page: ReturnType<typeof readListPage>; shown: number; total: number };

/** What the pager below a list needs. */
export function pagerOf({ path, page, shown, total }: Listed, kept: Record<string, string> = {}) {
  const href = (number: number) => {
    const query = new URLSearchParams(kept);
    if (page.search) query.set("search", page.search);
    if (number > 1) query.set("page", String(number));
    const text = query.toString();
    return text ? `${path}?${text}` : path;
  };
  return {
    from: shown === 0 ? 0 : page.startRow + 1,
    to: page.startRow + shown,
    total,
    previousHref: page.number > 1 ? href(page.number - 1) : null,
    nextHref: page.startRow + shown < total ? href(page.number + 1) : null,
  };
}
