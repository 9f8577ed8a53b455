"use client";
import { useState } from "react";
import type { BenchDetail, BenchStatus } from "@/data/benches";
import { addBenchInput, editBenchInput, instrumentUnits, ownInstrumentKinds } from "@/data/benches/inputs";
import { collections, driverKinds } from "@/db/vocabulary";
import { Checkbox } from "@/ui/form/checkbox";
import { Form } from "@/ui/form/form";
import { HiddenInput } from "@/ui/form/hidden-input";
import { NumberInput } from "@/ui/form/number-input";
import { RadioGroup } from "@/ui/form/radio-group";
import { Select } from "@/ui/form/select";
import { SubmitButton } from "@/ui/form/submit-button";
import { TextInput } from "@/ui/form/text-input";
import { useServerForm } from "@/ui/form/use-server-form";
import { addBenchAction, editBenchAction } from "./actions";

type Bench = Pick<BenchStatus, "benchId" | "code" | "location" | "state"> & BenchDetail;
type Props = { bench: Bench | null; fluids: { value: string; label: string }[] };

/** A bench and what a new cycle on it starts from. A new one brings its channels and instruments along. */
export function BenchForm({ bench, fluids }: Props) {
  const form = useServerForm({
    action: bench ? editBenchAction : addBenchAction,
    schema: bench ? editBenchInput : addBenchInput,
    defaultValue: bench
      ? {
          code: bench.code,
          location: bench.location,
          repeatability: String(bench.repeatability),
          fluidId: bench.fluidId,
          driveVolts: String(bench.driveVolts),
          driverKind: bench.driverKind,
          periodMs: String(bench.periodMs),
        }
      : { collects: "volume", fluidId: fluids[0]?.value ?? "", driverKind: "saturated" },
  });
  const [collects, setCollects] = useState("volume");
  const unit = (bench?.collects ?? collects) === "mass" ? "g" : "mL";
  return (
    <Form form={form} guard className="flex max-w-3xl flex-col gap-2.5">
      {bench ? (
        <>
          <HiddenInput name="benchId" value={bench.benchId} />
          <HiddenInput name="version" value={bench.version} />
        </>
      ) : null}
      <div className="grid gap-x-4 tablet:grid-cols-2">
        <TextInput name="code" label="Bench code" maxLength={20} autoFocus={!bench} />
        <TextInput name="location" label="Location" optional maxLength={120} />
        <Select name="fluidId" label="Fluid" options={fluids} />
        <NumberInput
          name="repeatability"
          label="Repeatability"
          unit={unit}
          hint="Standard uncertainty of one collected amount."
        />
        <NumberInput name="driveVolts" label="Drive voltage" unit="V" />
        <Select name="driverKind" label="Driver" options={driverKinds} />
        <NumberInput name="periodMs" label="Period" unit="ms" />
      </div>
      {bench ? (
        <Checkbox
          name="retired"
          label="Retired: it takes no cycles any more"
          defaultChecked={bench.state === "retired"}
        />
      ) : (
        <>
          <RadioGroup name="collects" label="Collects" options={collections} onChoose={setCollects} />
          <div className="grid gap-x-4 tablet:grid-cols-3">
            <NumberInput name="channelCount" label="Channels" whole />
            <NumberInput name="channel.rangeHigh" label="Range of each" unit={unit} />
            <NumberInput name="channel.division" label="Division of each" unit={unit} />
          </div>
          <fieldset>
            <legend className="mb-1 text-heading font-semibold">Its own instruments</legend>
            {ownInstrumentKinds.map((kind, index) => (
              <div key={kind} className="grid items-start gap-x-4 tablet:grid-cols-[1fr_1fr_1fr]">
                <HiddenInput name={`instruments[${index}].kind`} value={kind} />
                <Checkbox
                  name={`instruments[${index}].present`}
                  label={kind}
                  defaultChecked={kind !== "drive supply"}
                />
                <NumberInput
                  name={`instruments[${index}].rangeHigh`}
                  label="Range"
                  unit={instrumentUnits[kind]}
                  defaultValue={usual[kind].rangeHigh}
                />
                <NumberInput
                  name={`instruments[${index}].division`}
                  label="Division"
                  unit={instrumentUnits[kind]}
                  defaultValue={usual[kind].division}
                />
              </div>
            ))}
          </fieldset>
        </>
      )}
      <div className="flex justify-end">
        <SubmitButton size="large" busyLabel="Saving">
          {bench ? "Save the bench" : "Add the bench"}
        </SubmitButton>
      </div>
    </Form>
  );
}

/** A start for what is typed; what stands on the instrument counts. Common practice, no source. */
const usual = {
  "pressure gauge": { rangeHigh: "1000", division: "1" },
  thermometer: { rangeHigh: "50", division: "0.1" },
  ohmmeter: { rangeHigh: "200", division: "0.01" },
  "pulse timer": { rangeHigh: "1000", division: "0.001" },
  "drive supply": { rangeHigh: "30", division: "0.1" },
};
