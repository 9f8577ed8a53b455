"use client";
import { workItems } from "@/db/vocabulary";
import { CheckboxGroup } from "@/ui/form/checkbox-group";
import { DateInput } from "@/ui/form/date-input";
import { Select } from "@/ui/form/select";
import { TextArea } from "@/ui/form/text-area";

export type ClassOption = { value: string; label: string };
type Props = { classes: ClassOption[]; earliest?: string; workAsked: readonly string[] };

/** What the customer wants, by when, and judged by which class. */
export function AskedPart({ classes, earliest, workAsked }: Props) {
  return (
    <div className="grid gap-x-4 tablet:grid-cols-2">
      <CheckboxGroup
        name="workAsked"
        label="Work asked for"
        options={workItems}
        defaultChosen={workAsked}
        className="tablet:col-span-2"
      />
      <Select name="toleranceClassId" label="Tolerance class" options={classes} placeholder="Choose" />
      <DateInput name="promisedOn" label="Promised" min={earliest} />
      <TextArea
        name="customerRequest"
        label="Customer's request"
        hint="In the customer's words; stands on the certificate."
        optional
        rows={2}
        maxLength={2000}
      />
      <TextArea
        name="internalNote"
        label="Internal note"
        hint="The customer never sees it."
        optional
        rows={2}
        maxLength={4000}
      />
    </div>
  );
}
