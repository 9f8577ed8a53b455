"use client";
import { Combobox } from "@/ui/form/combobox";
import { searchAt } from "@/ui/form/search-at";

type Found = { customerId: string; name: string };
type Props = { name: string; label: string; optional?: boolean };

const search = searchAt("/api/data/customers", ({ customerId, name }: Found) => ({
  value: customerId,
  label: name,
}));

/** The customer that somebody acts for. */
export function CustomerCombobox(props: Props) {
  return <Combobox {...props} search={search} placeholder="Begin to type a name" />;
}
