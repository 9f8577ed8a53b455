import type { Metadata } from "next";
import { currentContext } from "@/auth/current-actor";
import { authorize } from "@/data/access/authorize";
import { getCustomer } from "@/data/customers";
import { answerPage } from "@/data/edge/answer-page";
import { getLabCard } from "@/data/lab";
import { listToleranceClasses } from "@/data/tolerance-classes";
import { CheckInForm } from "@/features/sets/intake/check-in-form";
import { isoDayAfter } from "@/format/calendar";
import { PageHeader } from "@/ui/layout/page-header";

export const metadata: Metadata = { title: "Check in a set" };

const usualDays = 7;

export default async function CheckInPage({ searchParams }: PageProps<"/sets/new">) {
  const { customer: customerId } = await searchParams;
  const context = await currentContext();
  await answerPage(authorize(context, "checkInSet"));
  const { clock } = await answerPage(getLabCard(context));
  const classes = await answerPage(listToleranceClasses(context));
  const customer =
    typeof customerId === "string" ? await answerPage(getCustomer(context, { customerId })) : null;
  return (
    <>
      <PageHeader title="Check in a set" />
      <CheckInForm
        customer={customer && { value: customer.customerId, label: customer.name }}
        classes={classes.map(({ toleranceClassId, name }) => ({ value: toleranceClassId, label: name }))}
        today={isoDayAfter(clock, 0)}
        promisedOn={isoDayAfter(clock, usualDays)}
      />
    </>
  );
}
