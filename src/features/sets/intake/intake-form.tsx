"use client";
import { useState } from "react";
import type { SetDetail } from "@/data/sets";
import { editIntakeInput } from "@/data/sets/inputs";
import { Combobox } from "@/ui/form/combobox";
import type { ComboboxOption } from "@/ui/form/combobox-option";
import { Form } from "@/ui/form/form";
import { HiddenInput } from "@/ui/form/hidden-input";
import { SubmitButton } from "@/ui/form/submit-button";
import { TextArea } from "@/ui/form/text-area";
import { useServerForm } from "@/ui/form/use-server-form";
import { Sheet } from "@/ui/layout/sheet";
import { editIntakeAction } from "../actions";
import { AskedPart, type ClassOption } from "./asked-part";
import { CountStepper } from "./count-stepper";
import { InjectorRows } from "./injector-rows";
import { rowOf, withCount } from "./rows";
import { searchModels } from "./search-models";
import { useKnownSerials } from "./use-known-serials";

type Props = {
  set: SetDetail;
  model: ComboboxOption;
  classes: ClassOption[];
  /** Once the set has been measured, a change says why. */
  needsReason: boolean;
};

/** What was written down at check-in, put right. */
export function IntakeForm({ set, model, classes, needsReason }: Props) {
  const { setId, version, number } = set;
  const form = useServerForm({
    action: editIntakeAction,
    schema: editIntakeInput,
    defaultValue: {
      toleranceClassId: set.toleranceClass.toleranceClassId,
      promisedOn: set.promisedOn,
      customerRequest: set.customerRequest,
      internalNote: set.internalNote ?? "",
    },
  });
  const [modelId, setModelId] = useState(model.value);
  const here = set.injectors.filter(({ state }) => state === "in set");
  const [rows, setRows] = useState(() => here.map(rowOf));
  const knownBy = useKnownSerials(
    modelId,
    rows.map((row) => row.serial),
  );
  const errors = form.form.allErrors;
  return (
    <Form form={form} guard className="flex flex-col gap-3">
      <HiddenInput name="setId" value={setId} />
      <HiddenInput name="version" value={version} />
      <Sheet title="Injector model">
        <Combobox
          name="modelId"
          label="Injector model"
          search={searchModels}
          initial={model}
          onChoose={(option) => setModelId(option?.value ?? "")}
        />
      </Sheet>
      <Sheet
        title="Injectors"
        actions={
          <CountStepper
            count={rows.length}
            onChange={(count) => setRows(withCount(rows, Math.max(count, here.length)))}
          />
        }
      >
        <InjectorRows
          rows={rows}
          onChange={setRows}
          errorsOf={(name) => errors[name]}
          knownBy={knownBy}
          ownNumber={number}
        />
      </Sheet>
      <Sheet title="What is asked">
        <AskedPart classes={classes} workAsked={set.workAsked} />
      </Sheet>
      {needsReason ? (
        <Sheet title="Why it changes">
          <TextArea
            name="reason"
            label="Reason"
            hint="The set has been measured; the reason stays on the record."
            rows={2}
            maxLength={500}
          />
        </Sheet>
      ) : null}
      <div className="flex justify-end">
        <SubmitButton size="large" busyLabel="Saving">
          Save the intake data
        </SubmitButton>
      </div>
    </Form>
  );
}
