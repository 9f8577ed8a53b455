"use client";
import { useState } from "react";
import { Button } from "@/ui/form/button";
import { Combobox } from "@/ui/form/combobox";
import type { ComboboxOption } from "@/ui/form/combobox-option";
import { TextArea } from "@/ui/form/text-area";
import { TextInput } from "@/ui/form/text-input";
import { searchCustomers } from "./search-customers";

/** The customer: found by typing, or entered anew in the same form. */
export function CustomerPart({ initial }: { initial: ComboboxOption | null }) {
  const [newName, setNewName] = useState<string | null>(null);
  if (newName === null)
    return (
      <>
        <input type="hidden" name="customer.is" value="known" readOnly />
        <Combobox
          name="customer.customerId"
          label="Customer"
          placeholder="Begin to type a name"
          search={searchCustomers}
          initial={initial}
          autoFocus={!initial}
          onCreate={setNewName}
          createLabel={(typed) => `New customer “${typed}”`}
        />
      </>
    );
  return (
    <fieldset className="grid gap-x-4 tablet:grid-cols-2">
      <legend className="mb-1 flex w-full items-baseline justify-between gap-2 text-heading font-semibold">
        New customer
        <Button kind="quiet" size="small" onClick={() => setNewName(null)}>
          Choose a known one instead
        </Button>
      </legend>
      <input type="hidden" name="customer.is" value="new" readOnly />
      <TextInput
        name="customer.name"
        label="Customer's name"
        defaultValue={newName}
        maxLength={160}
        autoFocus
      />
      <TextInput name="customer.contactName" label="Contact" optional maxLength={120} />
      <TextInput name="customer.email" label="E-mail" type="email" optional maxLength={254} />
      <TextInput name="customer.phone" label="Phone" type="tel" optional maxLength={60} />
      <TextArea name="customer.address" label="Address" optional rows={2} maxLength={600} />
    </fieldset>
  );
}
