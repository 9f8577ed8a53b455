"use client";
import { draftField } from "../../../data/cycles/draft-fields";
import { conditionsOfBench, placesOnBench } from "../../../data/cycles/sheet/defaults";
import { isReady } from "../../../data/cycles/sheet/missing-calibrations";
import type { SheetFluid } from "../../../data/cycles/sheet/run-of-sheet";
import type { CycleBench, SheetInjector } from "../../../data/cycles/sheet/types";
import { driverKinds } from "../../../db/vocabulary";
import { Sheet } from "../../../ui/layout/sheet";
import { ConflictChoice } from "./conflict-choice";
import { useSheet } from "./sheet-context";
import { SheetInput } from "./sheet-input";
import { SheetSelect } from "./sheet-select";

type Props = {
  benches: CycleBench[];
  fluids: SheetFluid[];
  injectors: SheetInjector[];
  /** What recording found missing, by field. */
  missing: Record<string, string[]>;
  /** A correction is judged by the calibrations of its day, so any bench may be named. */
  anyBench: boolean;
};

const conflictNames: [string, string][] = [
  ["benchId", "Bench"],
  ["fluidId", "Fluid"],
  ["note", "Note"],
  ["repeats", "Runs"],
  [draftField.condition("fluidTemperatureC"), "Fluid temperature"],
  [draftField.condition("pressureKpa"), "Pressure"],
  [draftField.condition("driveVolts"), "Drive voltage"],
  [draftField.condition("driverKind"), "Driver"],
  [draftField.condition("periodMs"), "Period"],
  [draftField.sharedCheck("leadOhm"), "Leads"],
  [draftField.sharedCheck("windingTemperatureC"), "Winding temperature"],
  [draftField.sharedCheck("leakagePressureKpa"), "Leakage pressure"],
  [draftField.sharedCheck("leakageSeconds"), "Leakage time"],
];

/** The conditions that all readings of the cycle share. */
export function ConditionsPanel({ benches, fluids, injectors, missing, anyBench }: Props) {
  const { edit, fields, conflicts } = useSheet();

  function chooseBench(benchId: string): void {
    const bench = benches.find((candidate) => candidate.benchId === benchId);
    const brought = bench ? { ...conditionsOfBench(bench), ...placesFor(bench) } : { benchId };
    edit(Object.entries(brought).map(([field, value]) => ({ field, value })));
  }

  /** Channels that the bench has are kept as they were typed. */
  function placesFor(bench: CycleBench): Record<string, string> {
    const numbers = new Set(bench.channels.map((channel) => String(channel.number)));
    const fits = injectors.every(({ setInjectorId }) =>
      numbers.has(fields[draftField.channel(setInjectorId)] ?? ""),
    );
    return fits ? {} : placesOnBench(injectors, bench);
  }

  const said = (field: string) => missing[field]?.join(" ");
  const condition = (key: "fluidTemperatureC" | "pressureKpa" | "driveVolts" | "periodMs") => ({
    field: draftField.condition(key),
    missing: said(draftField.condition(key)),
  });
  return (
    <Sheet title="Conditions" note="as the instruments show them; pressure across the injector">
      <div className="grid grid-cols-2 gap-x-3 gap-y-0.5 tablet:grid-cols-4 desk:grid-cols-8">
        <SheetSelect
          label="Bench"
          field="benchId"
          missing={said("benchId")}
          onChoose={chooseBench}
          options={benches.map((bench) => ({
            value: bench.benchId,
            label: `${bench.code}${anyBench || isReady(bench) ? "" : bench.holdReason === null ? ", not in calibration" : ", on hold"}`,
            disabled: !anyBench && !isReady(bench) && fields.benchId !== bench.benchId,
          }))}
        />
        <SheetSelect
          label="Fluid"
          field="fluidId"
          missing={said("fluidId")}
          options={fluids.map((fluid) => ({ value: fluid.fluidId, label: fluid.name }))}
        />
        <SheetInput label="Fluid" unit="°C" {...condition("fluidTemperatureC")} />
        <SheetInput label="Pressure" unit="kPa" {...condition("pressureKpa")} />
        <SheetInput label="Drive" unit="V" {...condition("driveVolts")} />
        <SheetSelect
          label="Driver"
          field={draftField.condition("driverKind")}
          missing={said(draftField.condition("driverKind"))}
          options={driverKinds.map((kind) => ({ value: kind, label: kind }))}
        />
        <SheetInput label="Period" unit="ms" {...condition("periodMs")} />
        <SheetInput label="Runs" field="repeats" unit="×" />
        <SheetInput label="Winding" unit="°C" field={draftField.sharedCheck("windingTemperatureC")} />
        <SheetInput label="Leads" unit="Ω" field={draftField.sharedCheck("leadOhm")} />
        <SheetInput label="Leakage at" unit="kPa" field={draftField.sharedCheck("leakagePressureKpa")} />
        <SheetInput label="Leakage for" unit="s" field={draftField.sharedCheck("leakageSeconds")} />
        <SheetInput label="Note" field="note" className="col-span-2 tablet:col-span-4" />
      </div>
      {conflictNames
        .filter(([field]) => conflicts[field])
        .map(([field, name]) => (
          <ConflictChoice key={field} field={field} name={name} />
        ))}
    </Sheet>
  );
}
