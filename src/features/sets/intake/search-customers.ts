import type { ComboboxOption } from "@/ui/form/combobox-option";

type Found = { customerId: string; name: string; contactName: string };

export async function searchCustomers(query: string): Promise<ComboboxOption[]> {
  const response = await fetch(`/api/data/customers?search=${encodeURIComponent(query)}`);
  if (!response.ok) throw new Error(`The search for customers answered ${response.status}`);
  const found: Found[] = await response.json();
  return found.map(({ customerId, name, contactName }) => ({
    value: customerId,
    label: name,
    note: contactName,
  }));
}
