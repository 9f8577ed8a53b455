"use client";
import type { Model } from "@/data/models";
import { addModelInput, editModelInput, modelLabels } from "@/data/models/inputs";
import { impedanceBands, sprayTypes } from "@/db/vocabulary";
import { Form } from "@/ui/form/form";
import { HiddenInput } from "@/ui/form/hidden-input";
import { NumberInput } from "@/ui/form/number-input";
import { Select } from "@/ui/form/select";
import { SubmitButton } from "@/ui/form/submit-button";
import { TextInput } from "@/ui/form/text-input";
import { useServerForm } from "@/ui/form/use-server-form";
import { addModelAction, editModelAction } from "./actions";
import { modelNumbers } from "./model-numbers";

type Props = { model: (Model & { version: number }) | null };

/** An injector model as its maker states it. Saving one that the counter entered confirms it. */
export function ModelForm({ model }: Props) {
  const form = useServerForm({
    action: model ? editModelAction : addModelAction,
    schema: model ? editModelInput : addModelInput,
    defaultValue: model
      ? Object.fromEntries(Object.entries(model).map(([name, value]) => [name, String(value)]))
      : {},
  });
  return (
    <Form form={form} guard className="flex max-w-4xl flex-col gap-2.5">
      {model ? (
        <>
          <HiddenInput name="modelId" value={model.modelId} />
          <HiddenInput name="version" value={model.version} />
        </>
      ) : null}
      <div className="grid gap-x-4 tablet:grid-cols-2 desk:grid-cols-4">
        <TextInput name="make" label={modelLabels.make} maxLength={80} autoFocus={!model} />
        <TextInput name="partNumber" label={modelLabels.partNumber} maxLength={80} />
        <Select
          name="impedanceBand"
          label={modelLabels.impedanceBand}
          options={impedanceBands}
          placeholder="Choose"
        />
        <Select name="sprayType" label={modelLabels.sprayType} options={sprayTypes} placeholder="Choose" />
        {modelNumbers.map(({ key, label, unit }) => (
          <NumberInput key={key} name={key} label={label} unit={unit} />
        ))}
      </div>
      <div className="flex justify-end">
        <SubmitButton size="large" busyLabel="Saving">
          {model ? (model.confirmed ? "Save the model" : "Save and confirm the model") : "Add the model"}
        </SubmitButton>
      </div>
    </Form>
  );
}
