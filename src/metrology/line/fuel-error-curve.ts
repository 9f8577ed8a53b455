import { requireFinite, requireNumber } from "../limits";
import { sumOf } from "./sum-of";

type Line = { slopeUlPerMs: number; deadTimeMs: number };

/** `errorsPercent` stand in the order of the lines. */
export type FuelError = { pulseWidthMs: number; meanUl: number; errorsPercent: number[] };

/**
 * How far each injector of a set is from the set's mean fuel at every pulse width, in percent of that mean.
 *
 * Fuel is what the flow line delivers, S · (w − t0), and nothing at or below the dead time. A small mismatch of dead times
 * hardly shows at 10 ms and dominates at idle (common practice: 3 to 4 ms, no source).
 *
 * Units: ms, µL, %. Range: one line at least; widths above 0 at which one injector at least delivers.
 * Throws RangeError naming flowLines or the width and its limit.
 * Source: definition; common practice, no source.
 */
export function fuelErrorCurve(flowLines: readonly Line[], widthsMs: readonly number[]): FuelError[] {
  if (flowLines.length === 0) throw new RangeError("flowLines must be at least 1: none was given");
  flowLines.forEach(({ slopeUlPerMs, deadTimeMs }, index) => {
    requireNumber(`flowLines[${index}].slopeUlPerMs`, slopeUlPerMs, { above: 0 });
    requireNumber(`flowLines[${index}].deadTimeMs`, deadTimeMs);
  });
  return widthsMs.map((pulseWidthMs, index) => {
    requireNumber(`widthsMs[${index}]`, pulseWidthMs, { above: 0 });
    const fuels = flowLines.map(
      ({ slopeUlPerMs, deadTimeMs }) => slopeUlPerMs * Math.max(0, pulseWidthMs - deadTimeMs),
    );
    const meanUl = requireFinite("flowLines, widthsMs", sumOf(fuels) / fuels.length);
    if (meanUl === 0)
      throw new RangeError(
        `widthsMs[${index}] must be above the shortest dead time: ${pulseWidthMs} was given`,
      );
    const errorsPercent = fuels.map((fuel) => requireFinite("flowLines", (100 * (fuel - meanUl)) / meanUl));
    return { pulseWidthMs, meanUl, errorsPercent };
  });
}
