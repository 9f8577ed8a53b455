import type { SetRow } from "@/data/sets";
import type { PageOfRows, PageRequest } from "@/ui/grid/server-grid-types";

export type SetFilter = { view: string; search: string; customerId?: string };

/** A page of sets, as the server sorts and filters it. */
export async function fetchSets({
  startRow,
  endRow,
  sort: [first],
  filter,
}: PageRequest<SetFilter>): Promise<PageOfRows<SetRow>> {
  const query = new URLSearchParams({
    startRow: String(startRow),
    endRow: String(endRow),
    view: filter.view,
    search: filter.search,
    ...(filter.customerId ? { customerId: filter.customerId } : {}),
    ...(first ? { sort: first.column, descending: String(first.direction === "desc") } : {}),
  });
  const response = await fetch(`/api/data/sets?${query}`);
  if (!response.ok) throw new Error(`The list of sets answered ${response.status}`);
  return response.json();
}
