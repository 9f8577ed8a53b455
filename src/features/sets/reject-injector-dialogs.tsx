"use client";
import type { SetInjector } from "@/data/sets";
import { rejectInjectorInput, replaceInjectorInput } from "@/data/sets/injector-inputs";
import { injectorConditions } from "@/db/vocabulary";
import { FormDialog } from "@/ui/form/form-dialog";
import { ReasonDialog } from "@/ui/form/reason-dialog";
import { Select } from "@/ui/form/select";
import { TextInput } from "@/ui/form/text-input";
import { rejectInjectorAction, replaceInjectorAction } from "./actions";

type Props = { injector: Pick<SetInjector, "setInjectorId" | "tag" | "serial"> };

/** Takes an injector out of the set; it stays on record with the reason. */
export function RejectInjectorDialog({ injector: { setInjectorId, tag, serial } }: Props) {
  return (
    <ReasonDialog
      trigger="Reject"
      triggerKind="quiet"
      triggerSize="small"
      title={`Reject injector ${tag}`}
      description={`${serial ? `Serial ${serial}. ` : ""}It counts no longer in the set's spreads and stays on record; another may take its place.`}
      action={rejectInjectorAction}
      schema={rejectInjectorInput}
      fields={{ setInjectorId }}
      submitLabel={`Reject ${tag}`}
      submitKind="danger"
      reasonHint="Printed on the certificate."
    />
  );
}

/** Puts another injector in the place of a rejected one. */
export function ReplaceInjectorDialog({ injector: { setInjectorId, tag } }: Props) {
  return (
    <FormDialog
      trigger="Replace"
      triggerSize="small"
      title={`Put another injector in the place of ${tag}`}
      description="It gets the same tag with a letter and is measured as left with the others."
      action={replaceInjectorAction}
      schema={replaceInjectorInput}
      fields={{ setInjectorId }}
      submitLabel="Take it into the set"
      submitKind="primary"
    >
      <TextInput name="serial" label="Serial" optional maxLength={60} />
      <TextInput name="marking" label="Marking" optional maxLength={60} />
      <Select name="condition" label="Condition" options={injectorConditions} placeholder="Choose" />
      <TextInput name="conditionNote" label="Note on its condition" optional maxLength={500} />
    </FormDialog>
  );
}
