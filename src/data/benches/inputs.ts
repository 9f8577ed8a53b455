import { z } from "zod";
import { collections, driverKinds, type InstrumentKind, instrumentKinds } from "../../db/vocabulary";
import {
  baseVersion,
  choice,
  decimal,
  id,
  optionalText,
  reason,
  text,
  tick,
  wholeNumber,
  writeInput,
} from "../fields";

/** What an instrument indicates in. */
export const instrumentUnits: Record<InstrumentKind, string> = {
  cylinder: "mL",
  balance: "g",
  "pressure gauge": "kPa",
  thermometer: "°C",
  ohmmeter: "Ω",
  "pulse timer": "ms",
  "drive supply": "V",
};

/** What every bench has one of; the rest belongs to its channels. A supply is listed where the lab calibrates it. */
export const ownInstrumentKinds = [
  "pressure gauge",
  "thermometer",
  "ohmmeter",
  "pulse timer",
  "drive supply",
] as const satisfies InstrumentKind[];

const scale = {
  rangeHigh: decimal({ label: "Range", low: 0.0001, high: 99_999, decimals: 4 }),
  division: decimal({ label: "Division", low: 0.000001, high: 1000, decimals: 6 }),
};

const identity = {
  code: text({ label: "Instrument's code", longest: 30 }),
  maker: optionalText({ label: "Maker", longest: 80 }),
  serial: optionalText({ label: "Serial", longest: 80 }),
  intervalMonths: wholeNumber({ label: "Interval", low: 1, high: 120, unit: "months" }),
};

const benchFields = {
  code: text({ label: "Bench code", longest: 20 }),
  location: optionalText({ label: "Location", longest: 120 }),
  repeatability: decimal({ label: "Repeatability", low: 0, high: 100, decimals: 5 }),
  fluidId: id("fluid"),
  driveVolts: decimal({ label: "Drive voltage", low: 1, high: 100, decimals: 2, unit: "V" }),
  driverKind: choice("Driver", driverKinds),
  periodMs: decimal({ label: "Period", low: 0.1, high: 10_000, decimals: 3, unit: "ms" }),
};

export const addBenchInput = writeInput({
  ...benchFields,
  collects: choice("Collects", collections),
  channelCount: wholeNumber({ label: "Channels", low: 1, high: 24 }),
  channel: z.object(scale),
  /** The bench's own instruments; one that the bench does not have is left out. */
  instruments: z
    .array(z.object({ kind: choice("Instrument", ownInstrumentKinds), present: tick(), ...scale }))
    .max(ownInstrumentKinds.length),
});
export const editBenchInput = writeInput({
  benchId: id("bench"),
  version: baseVersion,
  ...benchFields,
  retired: tick(),
});
export const editInstrumentInput = writeInput({
  instrumentId: id("instrument"),
  version: baseVersion,
  ...identity,
});
export const placeInstrumentInput = writeInput({
  benchId: id("bench"),
  channelId: z
    .literal("")
    .optional()
    .transform(() => null)
    .or(id("channel")),
  kind: choice("Instrument", instrumentKinds),
  ...identity,
  ...scale,
  reason: reason(),
});
export const holdBenchInput = writeInput({ benchId: id("bench"), reason: reason() });
export const clearBenchHoldInput = writeInput({ benchId: id("bench"), reason: reason() });
export const getBenchInput = z.object({ benchId: id("bench") });
export const listBenchesInput = z
  .object({ withRetired: z.boolean().catch(false) })
  .nullish()
  .transform((typed) => typed ?? { withRetired: false });
