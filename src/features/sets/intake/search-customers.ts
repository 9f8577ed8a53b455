import { searchAt } from "@/ui/form/search-at";

type Found = { customerId: string; name: string; contactName: string };

export const searchCustomers = searchAt(
  "/api/data/customers",
  ({ customerId, name, contactName }: Found) => ({
    value: customerId,
    label: name,
    note: contactName,
  }),
);
