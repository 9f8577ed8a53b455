"use client";
import { addFluidInput } from "@/data/fluids/inputs";
import { Form } from "@/ui/form/form";
import { NumberInput } from "@/ui/form/number-input";
import { SubmitButton } from "@/ui/form/submit-button";
import { TextInput } from "@/ui/form/text-input";
import { useServerForm } from "@/ui/form/use-server-form";
import { addFluidAction } from "./actions";

/** A test fluid. Its figures are never changed, since cycles rest on them: a better figure is another fluid. */
export function AddFluidForm() {
  const form = useServerForm({ action: addFluidAction, schema: addFluidInput, resetWhenDone: true });
  return (
    <Form form={form} className="flex max-w-3xl flex-col gap-2.5">
      <div className="grid gap-x-4 tablet:grid-cols-2">
        <TextInput name="name" label="Fluid's name" maxLength={80} />
        <TextInput name="source" label="Source" hint="Where its figures come from." maxLength={300} />
        <NumberInput name="densityAt15GPerMl" label="Density at 15 °C" unit="g/mL" />
        <NumberInput name="expansionPerK" label="Expansion at 15 °C" unit="per K" />
      </div>
      <div className="flex justify-end">
        <SubmitButton busyLabel="Adding">Add the fluid</SubmitButton>
      </div>
    </Form>
  );
}
