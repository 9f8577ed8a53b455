"use client";
import { recordCleaningRunInput } from "@/data/cleaning-runs/inputs";
import { renewableParts } from "@/db/vocabulary";
import { Checkbox } from "@/ui/form/checkbox";
import { CheckboxGroup } from "@/ui/form/checkbox-group";
import { Form } from "@/ui/form/form";
import { HiddenInput } from "@/ui/form/hidden-input";
import { NumberInput } from "@/ui/form/number-input";
import { SubmitButton } from "@/ui/form/submit-button";
import { TextArea } from "@/ui/form/text-area";
import { TextInput } from "@/ui/form/text-input";
import { useServerForm } from "@/ui/form/use-server-form";
import { recordCleaningRunAction } from "./actions";

/** What the bath did to a set. */
export function CleaningRunForm({ setId, number }: { setId: string; number: string }) {
  const form = useServerForm({ action: recordCleaningRunAction, schema: recordCleaningRunInput });
  return (
    <Form form={form} guard>
      <HiddenInput name="setId" value={setId} />
      <div className="grid gap-x-4 tablet:grid-cols-2">
        <TextInput name="bath" label="Bath" maxLength={60} autoFocus />
        <TextInput name="detergentBatch" label="Detergent batch" maxLength={60} />
        <NumberInput name="minutes" label="Minutes" unit="min" />
        <NumberInput name="temperatureC" label="Bath temperature" unit="°C" />
      </div>
      <Checkbox name="backFlushed" label="Back-flushed" />
      <CheckboxGroup name="partsRenewed" label="Parts renewed" options={renewableParts} optional />
      <TextArea name="note" label="Note" optional rows={2} maxLength={2000} />
      <div className="flex justify-end">
        <SubmitButton size="large" busyLabel="Recording">
          Record the cleaning of {number}
        </SubmitButton>
      </div>
    </Form>
  );
}
