"use client";
import { useState } from "react";
import type { ToleranceClassRevision } from "@/data/tolerance-classes";
import { addToleranceClassInput, reviseToleranceClassInput } from "@/data/tolerance-classes/inputs";
import { Button } from "@/ui/form/button";
import { Form } from "@/ui/form/form";
import { HiddenInput } from "@/ui/form/hidden-input";
import { NumberInput } from "@/ui/form/number-input";
import { SubmitButton } from "@/ui/form/submit-button";
import { TextInput } from "@/ui/form/text-input";
import { useServerForm } from "@/ui/form/use-server-form";
import { addToleranceClassAction, reviseToleranceClassAction } from "./actions";

type Known = { toleranceClassId: string; version: number; latest: ToleranceClassRevision };

/** What a class asks of a set. A limit left empty is not judged; a change is a new revision. */
export function ClassForm({ known }: { known: Known | null }) {
  const latest = known?.latest;
  const form = useServerForm({
    action: known ? reviseToleranceClassAction : addToleranceClassAction,
    schema: known ? reviseToleranceClassInput : addToleranceClassInput,
    defaultValue: latest
      ? {
          staticSpreadPercent: text(latest.staticSpreadPercent),
          deadTimeRangeMs: text(latest.deadTimeRangeMs),
          resistanceRangeOhm: text(latest.resistanceRangeOhm),
          leakageLimitMm3PerMin: text(latest.leakageLimitMm3PerMin),
        }
      : {},
  });
  return (
    <Form form={form} guard className="flex max-w-2xl flex-col gap-2.5">
      {known ? (
        <>
          <HiddenInput name="toleranceClassId" value={known.toleranceClassId} />
          <HiddenInput name="version" value={known.version} />
        </>
      ) : (
        <TextInput name="name" label="Class name" maxLength={80} autoFocus />
      )}
      <div className="grid gap-x-4 tablet:grid-cols-2">
        <NumberInput name="staticSpreadPercent" label="Static flow spread" unit="%" optional />
        <NumberInput name="deadTimeRangeMs" label="Dead time range" unit="ms" optional />
        <NumberInput name="resistanceRangeOhm" label="Resistance range" unit="Ω" optional />
        <NumberInput
          name="leakageLimitMm3PerMin"
          label="Leakage limit"
          unit="mm³/min"
          hint="The model's own limit holds where it is tighter."
          optional
        />
      </div>
      <SpreadLimits limits={latest?.spreadLimits ?? []} errors={form.form.allErrors} />
      <div className="flex justify-end">
        <SubmitButton size="large" busyLabel="Saving">
          {known ? "Save as a new revision" : "Add the class"}
        </SubmitButton>
      </div>
    </Form>
  );
}

function text(value: number | null): string {
  return value === null ? "" : String(value);
}

type Limits = ToleranceClassRevision["spreadLimits"];

function SpreadLimits({ limits, errors }: { limits: Limits; errors: Record<string, string[] | undefined> }) {
  const [rows, setRows] = useState(() =>
    limits.map((limit, key) => ({
      key,
      from: String(limit.fromPulseWidthMs),
      spread: String(limit.spreadPercent),
    })),
  );
  return (
    <fieldset>
      <legend className="mb-1 text-small font-medium">Spread allowed from each pulse width on</legend>
      {rows.map(({ key, from, spread }, index) => (
        <div key={key} className="flex items-start gap-3">
          <NumberInput
            name={`limits[${index}].fromPulseWidthMs`}
            label="From"
            labelHidden={index > 0}
            unit="ms"
            defaultValue={from}
            errors={errors[`limits[${index}].fromPulseWidthMs`]}
            className="w-28 tablet:w-36"
          />
          <NumberInput
            name={`limits[${index}].spreadPercent`}
            label="Spread"
            labelHidden={index > 0}
            unit="%"
            defaultValue={spread}
            errors={errors[`limits[${index}].spreadPercent`]}
            className="w-28 tablet:w-36"
          />
          <Button
            kind="quiet"
            size="small"
            className={index === 0 ? "mt-6" : "mt-1"}
            onClick={() => setRows(rows.filter((row) => row.key !== key))}
          >
            Remove
          </Button>
        </div>
      ))}
      <Button
        size="small"
        onClick={() =>
          setRows([...rows, { key: Math.max(-1, ...rows.map((row) => row.key)) + 1, from: "", spread: "" }])
        }
      >
        Add a limit
      </Button>
    </fieldset>
  );
}
