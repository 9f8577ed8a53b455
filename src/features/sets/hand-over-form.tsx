"use client";
import { handOverSetInput } from "@/data/sets/inputs";
import { handOverWays } from "@/db/vocabulary";
import { Form } from "@/ui/form/form";
import { HiddenInput } from "@/ui/form/hidden-input";
import { RadioGroup } from "@/ui/form/radio-group";
import { SubmitButton } from "@/ui/form/submit-button";
import { TextInput } from "@/ui/form/text-input";
import { useServerForm } from "@/ui/form/use-server-form";
import { handOverSetAction } from "./actions";

type Props = { setId: string; number: string; contactName: string };

/** Who took the set, and how. Done once; it stays on record. */
export function HandOverForm({ setId, number, contactName }: Props) {
  const form = useServerForm({
    action: handOverSetAction,
    schema: handOverSetInput,
    defaultValue: { takenBy: contactName, way: "collected" },
  });
  return (
    <Form form={form} className="flex max-w-xl flex-col gap-2.5">
      <HiddenInput name="setId" value={setId} />
      <RadioGroup name="way" label="Way" options={handOverWays} />
      <TextInput name="takenBy" label="Taken by" hint="Who received it, or the courier." maxLength={160} />
      <TextInput name="consignment" label="Consignment number" optional maxLength={80} />
      <div className="flex justify-end">
        <SubmitButton size="large" busyLabel="Handing over">
          Hand over {number}
        </SubmitButton>
      </div>
    </Form>
  );
}
