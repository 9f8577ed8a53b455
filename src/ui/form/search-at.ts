import type { ComboboxOption } from "./combobox-option";
import type { Search } from "./use-search";

/** Asks an address for what was typed so far, and shows what it answers. */
export function searchAt<Found>(address: string, toOption: (found: Found) => ComboboxOption): Search {
  return async function search(query) {
    const response = await fetch(`${address}?search=${encodeURIComponent(query)}`);
    if (!response.ok) throw new Error(`The search answered ${response.status}`);
    return ((await response.json()) as Found[]).map(toOption);
  };
}
