"use client";
import type { BenchPlace, PlacedInstrument } from "@/data/benches";
import { editInstrumentInput, instrumentUnits, placeInstrumentInput } from "@/data/benches/inputs";
import { FormDialog } from "@/ui/form/form-dialog";
import { NumberInput } from "@/ui/form/number-input";
import { ReasonDialog } from "@/ui/form/reason-dialog";
import { TextInput } from "@/ui/form/text-input";
import { editInstrumentAction, placeInstrumentAction } from "./actions";

/** Every place of a bench with what stands there: its identity can be put right, or another takes its place. */
export function PlaceInstrumentForms({ benchId, places }: { benchId: string; places: BenchPlace[] }) {
  return (
    <ul className="divide-y divide-hair-2 border-t border-hair-2">
      {places.map((place) => (
        <li
          key={`${place.channelId} ${place.kind}`}
          className="flex flex-wrap items-center justify-between gap-x-4 gap-y-1 px-4 py-1.5"
        >
          <span>
            {place.channelNumber === null ? place.kind : `channel ${place.channelNumber}, ${place.kind}`}
            <span className="text-ink-2"> {place.instrument?.code ?? "empty"}</span>
          </span>
          <span className="flex gap-1">
            {place.instrument ? <EditInstrumentDialog instrument={place.instrument} /> : null}
            <PlaceInstrumentDialog benchId={benchId} place={place} />
          </span>
        </li>
      ))}
    </ul>
  );
}

function EditInstrumentDialog({ instrument }: { instrument: PlacedInstrument }) {
  const { instrumentId, version, code, maker, serial, intervalMonths } = instrument;
  return (
    <FormDialog
      trigger="Edit"
      triggerKind="quiet"
      triggerSize="small"
      title={`Edit instrument ${code}`}
      action={editInstrumentAction}
      schema={editInstrumentInput}
      fields={{ instrumentId, version }}
      submitLabel="Save"
      submitKind="primary"
    >
      <Identity code={code} maker={maker} serial={serial} intervalMonths={String(intervalMonths)} />
    </FormDialog>
  );
}

function PlaceInstrumentDialog({ benchId, place }: { benchId: string; place: BenchPlace }) {
  const unit = instrumentUnits[place.kind];
  return (
    <ReasonDialog
      trigger={place.instrument ? "Put another in its place" : "Put one here"}
      triggerKind="quiet"
      triggerSize="small"
      title={`New ${place.kind}${place.channelNumber === null ? "" : ` in channel ${place.channelNumber}`}`}
      description={place.instrument ? `${place.instrument.code} is retired and stays on record.` : undefined}
      action={placeInstrumentAction}
      schema={placeInstrumentInput}
      fields={{ benchId, channelId: place.channelId ?? "", kind: place.kind }}
      submitLabel="Place it"
      submitKind="primary"
    >
      <Identity code="" maker="" serial="" intervalMonths="12" />
      <div className="grid grid-cols-2 gap-x-4">
        <NumberInput
          name="rangeHigh"
          label="Range"
          unit={unit}
          defaultValue={place.instrument ? String(place.instrument.rangeHigh) : ""}
        />
        <NumberInput
          name="division"
          label="Division"
          unit={unit}
          defaultValue={place.instrument ? String(place.instrument.division) : ""}
        />
      </div>
    </ReasonDialog>
  );
}

type Named = { code: string; maker: string; serial: string; intervalMonths: string };

function Identity({ code, maker, serial, intervalMonths }: Named) {
  return (
    <div className="grid grid-cols-2 gap-x-4">
      <TextInput name="code" label="Instrument's code" defaultValue={code} maxLength={30} />
      <NumberInput name="intervalMonths" label="Interval" unit="months" whole defaultValue={intervalMonths} />
      <TextInput name="maker" label="Maker" optional defaultValue={maker} maxLength={80} />
      <TextInput name="serial" label="Serial" optional defaultValue={serial} maxLength={80} />
    </div>
  );
}
