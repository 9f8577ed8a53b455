"use client";
import type { CustomerDetail } from "@/data/customers";
import { addCustomerInput, editCustomerInput } from "@/data/customers/inputs";
import { Form } from "@/ui/form/form";
import { HiddenInput } from "@/ui/form/hidden-input";
import { SubmitButton } from "@/ui/form/submit-button";
import { TextArea } from "@/ui/form/text-area";
import { TextInput } from "@/ui/form/text-input";
import { useServerForm } from "@/ui/form/use-server-form";
import { addCustomerAction, editCustomerAction } from "./actions";

/** A customer's own data, new or put right. */
export function CustomerForm({ customer }: { customer: CustomerDetail | null }) {
  const form = useServerForm({
    action: customer ? editCustomerAction : addCustomerAction,
    schema: customer ? editCustomerInput : addCustomerInput,
    defaultValue: customer
      ? { name: customer.name, ...customer.contact, internalNote: customer.internalNote ?? "" }
      : {},
  });
  return (
    <Form form={form} guard className="flex max-w-3xl flex-col gap-2.5">
      {customer ? (
        <>
          <HiddenInput name="customerId" value={customer.customerId} />
          <HiddenInput name="version" value={customer.version} />
        </>
      ) : null}
      <div className="grid gap-x-4 tablet:grid-cols-2">
        <TextInput name="name" label="Customer's name" maxLength={160} autoFocus={!customer} />
        <TextInput name="contactName" label="Contact" optional maxLength={120} />
        <TextInput name="email" label="E-mail" type="email" optional maxLength={254} />
        <TextInput name="phone" label="Phone" type="tel" optional maxLength={60} />
      </div>
      <TextArea name="address" label="Address" optional rows={3} maxLength={600} />
      <TextArea
        name="internalNote"
        label="Internal note"
        hint="The customer never sees it."
        optional
        rows={3}
        maxLength={4000}
      />
      <div className="flex justify-end">
        <SubmitButton size="large" busyLabel="Saving">
          {customer ? "Save the customer" : "Add the customer"}
        </SubmitButton>
      </div>
    </Form>
  );
}
