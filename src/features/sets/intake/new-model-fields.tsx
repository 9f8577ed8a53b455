"use client";
import { modelLabels } from "@/data/models/inputs";
import { impedanceBands, sprayTypes } from "@/db/vocabulary";
import { NumberInput } from "@/ui/form/number-input";
import { Select } from "@/ui/form/select";
import { TextInput } from "@/ui/form/text-input";

const numbers = [
  { key: "resistanceLowOhm", unit: "Ω" },
  { key: "resistanceHighOhm", unit: "Ω" },
  { key: "ratedFlowMlPerMin", unit: "mL/min" },
  { key: "ratedFlowBandPercent", unit: "%" },
  { key: "ratedPressureKpa", unit: "kPa" },
  { key: "leakageLimitMm3PerMin", unit: "mm³/min" },
  { key: "leakagePressureKpa", unit: "kPa" },
] as const;

/** A model's own data, as its maker states them. The first word that was typed is taken for the make. */
export function NewModelFields({ typed }: { typed: string }) {
  const [make = "", ...rest] = typed.split(/\s+/);
  return (
    <div className="grid gap-x-4 tablet:grid-cols-2 desk:grid-cols-4">
      <TextInput name="model.make" label={modelLabels.make} defaultValue={make} maxLength={80} autoFocus />
      <TextInput
        name="model.partNumber"
        label={modelLabels.partNumber}
        defaultValue={rest.join(" ")}
        maxLength={80}
      />
      <Select
        name="model.impedanceBand"
        label={modelLabels.impedanceBand}
        options={impedanceBands}
        placeholder="Choose"
      />
      <Select
        name="model.sprayType"
        label={modelLabels.sprayType}
        options={sprayTypes}
        placeholder="Choose"
      />
      {numbers.map(({ key, unit }) => (
        <NumberInput key={key} name={`model.${key}`} label={modelLabels[key].split(",")[0]} unit={unit} />
      ))}
    </div>
  );
}
