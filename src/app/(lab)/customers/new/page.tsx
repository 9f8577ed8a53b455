import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { authorize } from "@/data/access/authorize";
import { answerPage } from "@/data/edge/answer-page";
import { CustomerForm } from "@/features/customers/customer-form";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";

export const metadata: Metadata = { title: "New customer" };

export default async function NewCustomerPage() {
  await answerPage(authorize(await currentContext(), "addCustomer"));
  return (
    <>
      <PageHeader title="New customer" back={<Link href="/customers">Customers</Link>} />
      <Sheet>
        <CustomerForm customer={null} />
      </Sheet>
    </>
  );
}
