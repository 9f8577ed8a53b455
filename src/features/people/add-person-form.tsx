"use client";
import { useState } from "react";
import { addPersonInput } from "@/data/people/inputs";
import { staffRoles } from "@/db/vocabulary";
import { CheckboxGroup } from "@/ui/form/checkbox-group";
import { Form } from "@/ui/form/form";
import { RadioGroup } from "@/ui/form/radio-group";
import { SubmitButton } from "@/ui/form/submit-button";
import { TextInput } from "@/ui/form/text-input";
import { useServerForm } from "@/ui/form/use-server-form";
import { addPersonAction } from "./actions";
import { CustomerCombobox } from "./customer-combobox";

/** A new account; the person sets the password by the link that comes back. */
export function AddPersonForm() {
  const form = useServerForm({
    action: addPersonAction,
    schema: addPersonInput,
    defaultValue: { kind: "staff" },
    resetWhenDone: true,
  });
  const [kind, setKind] = useState("staff");
  return (
    <Form form={form} className="flex max-w-2xl flex-col gap-2.5">
      <div className="grid gap-x-4 tablet:grid-cols-2">
        <TextInput name="name" label="Name" maxLength={120} autoFocus />
        <TextInput name="email" label="E-mail" type="email" maxLength={254} />
      </div>
      <RadioGroup
        name="kind"
        label="Works for"
        options={[
          { value: "staff", label: "the lab" },
          { value: "customer", label: "a customer" },
        ]}
        onChoose={setKind}
      />
      {kind === "staff" ? (
        <CheckboxGroup name="roles" label="Roles" options={staffRoles} />
      ) : (
        <CustomerCombobox name="customerId" label="Customer" />
      )}
      <div className="flex justify-end">
        <SubmitButton size="large" busyLabel="Adding">
          Add and make a set-up link
        </SubmitButton>
      </div>
    </Form>
  );
}
