import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { getCustomer } from "@/data/customers";
import { answerPage } from "@/data/edge/answer-page";
import { CustomerForm } from "@/features/customers/customer-form";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";

export const metadata: Metadata = { title: "Edit customer" };

export default async function EditCustomerPage({ params }: PageProps<"/customers/[customerId]/edit">) {
  const { customerId } = await params;
  const customer = await answerPage(getCustomer(await currentContext(), { customerId }));
  return (
    <>
      <PageHeader
        title={`Edit ${customer.name}`}
        back={<Link href={`/customers/${customerId}`}>{customer.name}</Link>}
      />
      <Sheet>
        <CustomerForm customer={customer} />
      </Sheet>
    </>
  );
}
