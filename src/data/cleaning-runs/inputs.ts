import { renewableParts } from "../../db/vocabulary";
import { choices, decimal, id, optionalText, reason, text, tick, writeInput } from "../fields";

const cleaningRunFields = {
  bath: text({ label: "Bath", longest: 60 }),
  detergentBatch: text({ label: "Detergent batch", longest: 60 }),
  minutes: decimal({ label: "Minutes", low: 0.5, high: 600, decimals: 1, unit: "min" }),
  temperatureC: decimal({ label: "Bath temperature", low: 5, high: 95, decimals: 1, unit: "°C" }),
  backFlushed: tick(),
  partsRenewed: choices("Parts renewed", renewableParts),
  note: optionalText({ label: "Note", longest: 2000, lines: "many" }),
};

export const recordCleaningRunInput = writeInput({ setId: id("set"), ...cleaningRunFields });
export const correctCleaningRunInput = writeInput({
  cleaningRunId: id("cleaning run"),
  ...cleaningRunFields,
  reason: reason("Reason for the correction"),
});
