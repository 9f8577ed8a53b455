"use client";
import { useRef, useState } from "react";
import { checkInSetInput } from "@/data/sets/inputs";
import { plural } from "@/format/plural";
import type { ComboboxOption } from "@/ui/form/combobox-option";
import { Form } from "@/ui/form/form";
import { SubmitButton } from "@/ui/form/submit-button";
import { useServerForm } from "@/ui/form/use-server-form";
import { Sheet } from "@/ui/layout/sheet";
import { checkInSetAction } from "../actions";
import { AskedPart, type ClassOption } from "./asked-part";
import { CountStepper } from "./count-stepper";
import { CustomerPart } from "./customer-part";
import { InjectorRows } from "./injector-rows";
import { ModelPart } from "./model-part";
import { newRow, withCount } from "./rows";
import { useKnownSerials } from "./use-known-serials";

type Props = {
  customer: ComboboxOption | null;
  classes: ClassOption[];
  today: string;
  promisedOn: string;
};

const usualCount = 4;
const usualWork = ["clean", "flow test", "match"];

/** One form from the parcel to the tags: who, what, how many, what is asked. */
export function CheckInForm({ customer, classes, today, promisedOn }: Props) {
  const form = useServerForm({
    action: checkInSetAction,
    schema: checkInSetInput,
    defaultValue: {
      promisedOn,
      toleranceClassId: classes.length === 1 ? classes[0]!.value : "",
    },
  });
  const [modelId, setModelId] = useState("");
  const [rows, setRows] = useState(() => withCount([newRow()], usualCount));
  const knownBy = useKnownSerials(
    modelId,
    rows.map((row) => row.serial),
  );
  const asked = useRef<HTMLDivElement>(null);
  const errors = form.form.allErrors;

  return (
    <Form form={form} guard className="flex flex-col gap-3">
      <div className="grid gap-3 laptop:grid-cols-2">
        <Sheet title="Customer">
          <CustomerPart initial={customer} />
        </Sheet>
        <Sheet title="Injector model">
          <ModelPart initial={null} onModel={setModelId} />
        </Sheet>
      </div>
      <Sheet
        title="Injectors"
        note="Enter goes to the next serial; a column can be pasted"
        actions={<CountStepper count={rows.length} onChange={(count) => setRows(withCount(rows, count))} />}
      >
        <InjectorRows
          rows={rows}
          onChange={setRows}
          errorsOf={(name) => errors[name]}
          knownBy={knownBy}
          onLastEnter={() => asked.current?.querySelector<HTMLElement>("input, select")?.focus()}
        />
      </Sheet>
      <div ref={asked}>
        <Sheet title="What is asked">
          <AskedPart classes={classes} earliest={today} workAsked={usualWork} />
        </Sheet>
      </div>
      <div className="flex justify-end">
        <SubmitButton size="large" busyLabel="Checking in">
          Check in {plural(rows.length, "injector")}
        </SubmitButton>
      </div>
    </Form>
  );
}
