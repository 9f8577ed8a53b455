import type { Context } from "../../src/data/access/actor";
import { addBench, getBench } from "../../src/data/benches";
import { recordCalibrations } from "../../src/data/calibrations";
import type { Collection, InstrumentKind } from "../../src/db/vocabulary";
import { keyed } from "./acting";

/** What an instrument's calibration says of it: true = gain · indicated + offset. */
export type Figures = { gain: number; offset: number; gainU: number; offsetU: number };

export type CalibratedBench = { benchId: string; code: string; channels: Figures[] };

type Asked = {
  code: string;
  fluidId: string;
  validFrom: string;
  validUntil: string;
  location?: string;
  collects?: Collection;
  channels?: number;
};

const scales: Partial<Record<InstrumentKind, { rangeHigh: number; division: number }>> = {
  "pressure gauge": { rangeHigh: 1000, division: 1 },
  thermometer: { rangeHigh: 50, division: 0.1 },
  ohmmeter: { rangeHigh: 200, division: 0.01 },
  "pulse timer": { rangeHigh: 1000, division: 0.001 },
};

const ownFigures: Partial<Record<InstrumentKind, Figures>> = {
  "pressure gauge": { gain: 1.0008, offset: -0.2, gainU: 0.0005, offsetU: 0.3 },
  thermometer: { gain: 1, offset: 0.05, gainU: 0.0002, offsetU: 0.04 },
  ohmmeter: { gain: 0.9996, offset: 0.004, gainU: 0.0003, offsetU: 0.004 },
  "pulse timer": { gain: 1, offset: 0.0004, gainU: 0.00002, offsetU: 0.0005 },
};

/** A bench with an instrument in every place and a calibration of every instrument. */
export async function addCalibratedBench(manager: Context, asked: Asked): Promise<CalibratedBench> {
  const { code, fluidId, location = "", collects = "volume", channels = 8 } = asked;
  const { benchId } = await addBench(
    manager,
    keyed({
      code,
      location,
      collects,
      repeatability: 0.03,
      fluidId,
      driveVolts: 14,
      driverKind: "saturated",
      periodMs: 20,
      channelCount: channels,
      channel: collects === "volume" ? { rangeHigh: 100, division: 0.2 } : { rangeHigh: 200, division: 0.01 },
      instruments: Object.entries(scales).map(([kind, scale]) => ({ kind, present: true, ...scale })),
    }),
  );
  return { benchId, code, channels: await calibrateBench(manager, { ...asked, benchId }) };
}

type Calibrating = {
  benchId: string;
  code: string;
  validFrom: string;
  validUntil: string;
  takeOver?: boolean;
};

/** Calibrates whatever stands on the bench; answers with the figures of its channels by number. */
export async function calibrateBench(
  manager: Context,
  { benchId, code, validFrom, validUntil, takeOver = false }: Calibrating,
): Promise<Figures[]> {
  const { detail } = await getBench(manager, { benchId });
  const placed = detail!.places.flatMap(({ instrument, kind, channelNumber }) =>
    instrument ? [{ instrument, kind, channelNumber }] : [],
  );
  const figuresOf = ({ kind, channelNumber }: (typeof placed)[number]) =>
    channelNumber === null ? ownFigures[kind]! : channelFigures(code, channelNumber);
  const entries = placed.map((place) => ({
    instrumentId: place.instrument.instrumentId,
    reference: `${place.instrument.code}/${validFrom.slice(0, 7)}`,
    validFrom,
    validUntil,
    ...figuresOf(place),
    note: "",
  }));
  await recordCalibrations(manager, keyed({ benchId, entries, takeOver }));
  return placed.filter(({ channelNumber }) => channelNumber !== null).map(figuresOf);
}

/** Every cylinder is a little off in its own way, and always in the same. */
function channelFigures(code: string, channel: number): Figures {
  const turn = Math.sin(channel * 2.4 + code.length * 0.7 + code.charCodeAt(code.length - 1));
  return {
    gain: Number((1 + 0.004 * turn).toFixed(6)),
    offset: Number((0.06 * Math.cos(5 * turn)).toFixed(4)),
    gainU: 0.0006,
    offsetU: 0.02,
  };
}
