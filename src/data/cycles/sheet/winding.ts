import { combineUncertainty } from "../../../metrology/uncertainty/combine-uncertainty";
import { resistanceAt20C } from "../../../metrology/winding/resistance-at-20c";
import type { InjectorChecks } from "../results";
import { conditionOf } from "./condition";
import type { Run } from "./run";

const resistanceConstantC = 234.5;

/**
 * Winding resistance at 20 °C with its expanded uncertainty; null when it was not measured. Leads measured with the same
 * meter are taken off before its gain counts, so that its offset cancels.
 */
export function windingAt20C(
  { windingOhm, leadOhm, windingTemperatureC }: InjectorChecks,
  { ohmmeter, thermometer }: Run["instruments"],
): { ohmsAt20C: number; expandedUncertainty: number } | null {
  if (windingOhm === null || windingTemperatureC === null) return null;
  const resistance = ownResistance(windingOhm, leadOhm, ohmmeter);
  if (resistance.value <= 0) return null;
  const temperature = conditionOf(thermometer, windingTemperatureC);
  const ohmsAt20C = resistanceAt20C(resistance.value, temperature.value);
  const { expandedUncertainty } = combineUncertainty([
    {
      name: "ohmmeter",
      standardUncertainty: resistance.standardUncertainty,
      sensitivity: ohmsAt20C / resistance.value,
    },
    {
      name: "temperature of the winding",
      standardUncertainty: temperature.standardUncertainty,
      sensitivity: ohmsAt20C / (resistanceConstantC + temperature.value),
    },
  ]);
  return { ohmsAt20C, expandedUncertainty };
}

function ownResistance(windingOhm: number, leadOhm: number | null, ohmmeter: Run["instruments"]["ohmmeter"]) {
  const read = conditionOf(ohmmeter, windingOhm);
  if (leadOhm === null || !ohmmeter?.calibration) return { ...read, value: read.value - (leadOhm ?? 0) };
  const { gain, gainU } = ohmmeter.calibration;
  const difference = windingOhm - leadOhm;
  return {
    value: gain * difference,
    standardUncertainty: Math.hypot(difference * gainU, ohmmeter.division / Math.sqrt(6)),
  };
}
