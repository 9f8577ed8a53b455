"use client";
import { useState } from "react";
import type { BenchPlace } from "@/data/benches";
import { instrumentUnits } from "@/data/benches/inputs";
import { recordCalibrationsInput } from "@/data/calibrations/inputs";
import { Checkbox } from "@/ui/form/checkbox";
import { controlStyle } from "@/ui/form/control-style";
import { Form } from "@/ui/form/form";
import { HiddenInput } from "@/ui/form/hidden-input";
import { SubmitButton } from "@/ui/form/submit-button";
import { useServerForm } from "@/ui/form/use-server-form";
import { recordCalibrationsAction } from "./actions";

type Props = { benchId: string; places: BenchPlace[]; validFrom: string; validUntil: string };

const figures = [
  { name: "reference", head: "Reference", numeric: false },
  { name: "gain", head: "Gain", numeric: true },
  { name: "gainU", head: "u(gain)", numeric: true },
  { name: "offset", head: "Offset", numeric: true },
  { name: "offsetU", head: "u(offset)", numeric: true },
] as const;

/** One line for each instrument; a line left empty was not calibrated. All are recorded, or none. */
export function RecordCalibrationsForm({ benchId, places, validFrom, validUntil }: Props) {
  const form = useServerForm({ action: recordCalibrationsAction, schema: recordCalibrationsInput });
  const [period, setPeriod] = useState({ validFrom, validUntil });
  const errors = form.form.allErrors;
  const here = places.flatMap((place) =>
    place.instrument ? [{ ...place, instrument: place.instrument }] : [],
  );
  return (
    <Form form={form} guard className="flex flex-col gap-3">
      <HiddenInput name="benchId" value={benchId} />
      <div className="flex flex-wrap gap-4">
        {(["validFrom", "validUntil"] as const).map((name) => (
          <label key={name} className="flex flex-col gap-1 text-small font-medium">
            {name === "validFrom" ? "Valid from" : "Valid until, the whole day"}
            <input
              type="date"
              value={period[name]}
              onChange={(event) => setPeriod({ ...period, [name]: event.target.value })}
              className={controlStyle}
            />
          </label>
        ))}
      </div>
      <div className="overflow-x-auto">
        <table className="w-full min-w-[44rem] border-collapse">
          <thead>
            <tr className="text-left text-key text-ink-2">
              <th className="py-1 pr-2 font-normal">Instrument</th>
              {figures.map(({ name, head }) => (
                <th key={name} className="px-1 py-1 font-normal">
                  {head}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {here.map(({ instrument, kind, channelNumber }, index) => {
              const at = (name: string) => `entries[${index}].${name}`;
              const wrong = [
                ...figures.map(({ name }) => at(name)),
                at("validFrom"),
                at("validUntil"),
              ].flatMap((name) => errors[name] ?? []);
              return (
                <tr key={instrument.instrumentId} className="border-t border-hair-2 align-top">
                  <th scope="row" className="py-1.5 pr-2 text-left font-medium">
                    {instrument.code}
                    <span className="block text-small font-normal text-ink-2">
                      {channelNumber === null ? kind : `channel ${channelNumber}`}, {instrumentUnits[kind]}
                    </span>
                    <input type="hidden" name={at("instrumentId")} value={instrument.instrumentId} readOnly />
                    <input type="hidden" name={at("validFrom")} value={period.validFrom} readOnly />
                    <input type="hidden" name={at("validUntil")} value={period.validUntil} readOnly />
                    {wrong.length > 0 ? (
                      <span role="alert" className="block max-w-56 text-small font-normal text-out">
                        {wrong.join(" ")}
                      </span>
                    ) : null}
                  </th>
                  {figures.map(({ name, head, numeric }) => (
                    <td key={name} className="px-1 py-1.5">
                      <input
                        name={at(name)}
                        aria-label={`${head} of ${instrument.code}`}
                        aria-invalid={errors[at(name)] ? true : undefined}
                        inputMode={numeric ? "decimal" : "text"}
                        autoComplete="off"
                        className={`${controlStyle} ${numeric ? "text-right" : ""}`}
                      />
                    </td>
                  ))}
                </tr>
              );
            })}
          </tbody>
        </table>
      </div>
      <Checkbox
        name="takeOver"
        label="Take over from the calibrations in force: they end now, as replaced"
        hint="Cycles that were measured under them keep them."
      />
      <div className="flex justify-end">
        <SubmitButton size="large" busyLabel="Recording">
          Record the calibrations
        </SubmitButton>
      </div>
    </Form>
  );
}
