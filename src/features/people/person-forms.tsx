"use client";
import { setPersonActiveInput, setPersonRolesInput } from "@/data/people/inputs";
import { staffRoles } from "@/db/vocabulary";
import { ActionButton } from "@/ui/form/action-button";
import { CheckboxGroup } from "@/ui/form/checkbox-group";
import { ConfirmDialog } from "@/ui/form/confirm-dialog";
import { Form } from "@/ui/form/form";
import { HiddenInput } from "@/ui/form/hidden-input";
import { SubmitButton } from "@/ui/form/submit-button";
import { useServerForm } from "@/ui/form/use-server-form";
import {
  endPersonSignInsAction,
  renewEntryLinkAction,
  setPersonActiveAction,
  setPersonRolesAction,
} from "./actions";
import { CustomerCombobox } from "./customer-combobox";

type Person = {
  personId: string;
  name: string;
  active: boolean;
  version: number;
  roles: readonly string[];
  actsFor: { customerId: string; name: string }[];
};

/** What a person may do: roles in the lab, and the customers they act for. */
export function RolesForm({ person }: { person: Person }) {
  const form = useServerForm({ action: setPersonRolesAction, schema: setPersonRolesInput });
  return (
    <Form form={form} className="flex max-w-2xl flex-col gap-2.5">
      <HiddenInput name="personId" value={person.personId} />
      <HiddenInput name="version" value={person.version} />
      <CheckboxGroup
        name="roles"
        label="Roles in the lab"
        options={staffRoles}
        defaultChosen={person.roles}
        optional
      />
      {person.actsFor.length > 0 ? (
        <CheckboxGroup
          name="customerIds"
          label="Acts for"
          options={person.actsFor.map(({ customerId, name }) => ({ value: customerId, label: name }))}
          defaultChosen={person.actsFor.map(({ customerId }) => customerId)}
          layout="column"
          optional
        />
      ) : null}
      <CustomerCombobox name="customerIds" label="Acts for another customer" optional />
      <div className="flex justify-end">
        <SubmitButton busyLabel="Saving">Save what {person.name} may do</SubmitButton>
      </div>
    </Form>
  );
}

/** Ending sign-ins, a new link, disabling. */
export function PersonSteps({ person: { personId, name, active } }: { person: Person }) {
  return (
    <div className="flex flex-wrap items-start gap-2">
      {active ? (
        <>
          <ActionButton action={renewEntryLinkAction} fields={{ personId }} busyLabel="Making">
            Make a new set-up link
          </ActionButton>
          <ActionButton action={endPersonSignInsAction} fields={{ personId }} busyLabel="Ending">
            End every sign-in
          </ActionButton>
        </>
      ) : null}
      <ConfirmDialog
        trigger={active ? "Disable" : "Enable"}
        title={`${active ? "Disable" : "Enable"} ${name}`}
        description={
          active
            ? "Nobody signs in to this account any more; open sign-ins end at once. What was recorded keeps the name."
            : "The account can be signed in to again, with the password it had."
        }
        action={setPersonActiveAction}
        schema={setPersonActiveInput}
        fields={{ personId, active: String(!active) }}
        submitLabel={active ? `Disable ${name}` : `Enable ${name}`}
        submitKind={active ? "danger" : "primary"}
      />
    </div>
  );
}
