"use client";
import { useState } from "react";
import type { LabDetails } from "@/data/lab";
import { editLabDetailsInput } from "@/data/lab/inputs";
import { paperSizes } from "@/db/vocabulary";
import { Button } from "@/ui/form/button";
import { Checkbox } from "@/ui/form/checkbox";
import { Form } from "@/ui/form/form";
import { HiddenInput } from "@/ui/form/hidden-input";
import { NumberInput } from "@/ui/form/number-input";
import { RadioGroup } from "@/ui/form/radio-group";
import { SubmitButton } from "@/ui/form/submit-button";
import { TextArea } from "@/ui/form/text-area";
import { TextInput } from "@/ui/form/text-input";
import { useServerForm } from "@/ui/form/use-server-form";
import { Sheet } from "@/ui/layout/sheet";
import { editLabDetailsAction } from "./actions";

/** What the lab says of itself, and how it usually measures. */
export function LabForm({ lab }: { lab: LabDetails }) {
  const { testPlan, version, releaserIsAnother, referenceDensityGPerMl, ...texts } = lab;
  const form = useServerForm({
    action: editLabDetailsAction,
    schema: editLabDetailsInput,
    defaultValue: {
      ...texts,
      referenceDensityGPerMl: String(referenceDensityGPerMl),
      heldOpenSeconds: testPlan.heldOpenSeconds === null ? "" : String(testPlan.heldOpenSeconds),
    },
  });
  return (
    <Form form={form} guard className="flex flex-col gap-3.5">
      <HiddenInput name="version" value={version} />
      <Sheet title="The lab" note="as it stands on every certificate">
        <div className="grid gap-x-4 tablet:grid-cols-2">
          <TextInput name="name" label="Lab's name" maxLength={160} />
          <TextInput name="phone" label="Phone" optional maxLength={60} />
          <TextInput name="email" label="E-mail" type="email" optional maxLength={254} />
          <TextInput
            name="timeZone"
            label="Time zone"
            hint="A name such as Europe/Berlin or UTC."
            maxLength={60}
          />
          <TextArea name="address" label="Address" optional maxLength={600} />
          <TextArea
            name="accreditation"
            label="Accreditation"
            hint="Nothing of it is printed when this is empty."
            optional
            maxLength={600}
          />
        </div>
      </Sheet>
      <Sheet title="Certificates">
        <TextArea
          name="certificateWording"
          label="Certificate wording"
          hint="A paragraph of the lab's own."
          optional
          maxLength={4000}
        />
        <RadioGroup name="paperSize" label="Paper" options={paperSizes} />
        <Checkbox
          name="releaserIsAnother"
          label="Who releases a certificate recorded none of it"
          hint="Switched off, one person may test and release, and the certificate says so."
          defaultChecked={releaserIsAnother}
        />
        <div className="grid gap-x-4 tablet:grid-cols-2">
          <TextInput name="referenceFluid" label="Reference fluid" maxLength={120} />
          <NumberInput name="referenceDensityGPerMl" label="Reference density" unit="g/mL" />
        </div>
      </Sheet>
      <Sheet title="Test plan" note="what a new cycle starts with">
        <PlannedWidths widths={testPlan.widths} errors={form.form.allErrors} />
        <NumberInput name="heldOpenSeconds" label="Held open" unit="s" optional className="max-w-40" />
      </Sheet>
      <div className="flex justify-end">
        <SubmitButton size="large" busyLabel="Saving">
          Save the settings
        </SubmitButton>
      </div>
    </Form>
  );
}

type Widths = LabDetails["testPlan"]["widths"];

function PlannedWidths({ widths, errors }: { widths: Widths; errors: Record<string, string[] | undefined> }) {
  const [rows, setRows] = useState(() => widths.map((width, index) => ({ key: index, ...width })));
  return (
    <div className="mb-3 flex flex-col">
      {rows.map(({ key, pulseWidthMs, pulseCount }, index) => (
        <div key={key} className="flex items-start gap-3">
          <NumberInput
            name={`widths[${index}].pulseWidthMs`}
            label="Pulse width"
            labelHidden={index > 0}
            unit="ms"
            defaultValue={pulseWidthMs ? String(pulseWidthMs) : ""}
            errors={errors[`widths[${index}].pulseWidthMs`]}
            className="w-28 tablet:w-36"
          />
          <NumberInput
            name={`widths[${index}].pulseCount`}
            label="Pulses"
            labelHidden={index > 0}
            whole
            defaultValue={pulseCount ? String(pulseCount) : ""}
            errors={errors[`widths[${index}].pulseCount`]}
            className="w-28 tablet:w-36"
          />
          <Button
            kind="quiet"
            size="small"
            className={index === 0 ? "mt-6" : "mt-1"}
            disabled={rows.length <= 3}
            onClick={() => setRows(rows.filter((row) => row.key !== key))}
          >
            Remove
          </Button>
        </div>
      ))}
      <div>
        <Button
          size="small"
          onClick={() =>
            setRows([
              ...rows,
              { key: Math.max(...rows.map((row) => row.key)) + 1, pulseWidthMs: 0, pulseCount: 0 },
            ])
          }
        >
          Add a pulse width
        </Button>
      </div>
    </div>
  );
}
